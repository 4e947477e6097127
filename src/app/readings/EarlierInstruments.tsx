import { newId, type Sheet } from '../../sheet'
import { nameWithSerial } from '../keep/earlier'
import { useEarlier } from '../keep/useEarlier'
import { usePageStore } from '../store'

/** The meters of earlier sheets, each to be added with all that is known of it; nothing where there are none. */
export function EarlierInstruments({ sheet }: { readonly sheet: Sheet }) {
  const store = usePageStore()
  const { instruments } = useEarlier()
  const here = new Set((sheet.instruments ?? []).map(nameWithSerial))
  const offered = instruments.filter((instrument) => !here.has(nameWithSerial(instrument)))
  if (offered.length === 0) return null
  const add = (name: string) => {
    const instrument = offered.find((each) => nameWithSerial(each) === name)
    if (!instrument) return
    store.getState().edit({
      kind: 'add-instrument',
      instrument: { ...instrument, id: newId(sheet, 'm1') },
    })
  }
  return (
    <select
      className="choice"
      aria-label="Add an instrument of an earlier sheet"
      value=""
      onChange={({ target }) => add(target.value)}
    >
      <option value="">Add one used before …</option>
      {offered.map((instrument) => (
        <option key={nameWithSerial(instrument)}>{nameWithSerial(instrument)}</option>
      ))}
    </select>
  )
}
