import { newId } from '../../sheet'
import { shownSheet, usePage, usePageStore } from '../store'
import { SumEditor } from './SumEditor'

/** The sums of the sheet: each an equation that is built by picking terms and signs. */
export function Sums() {
  const store = usePageStore()
  const sheet = usePage(shownSheet)
  const chosen = usePage((state) => state.chosenSum)
  const sums = sheet.sums ?? []

  const add = () => {
    const id = newId(sheet, 's')
    if (store.getState().edit({ kind: 'add-sum', sum: { id, terms: [] } })) {
      store.getState().chooseSum(id)
    }
  }

  return (
    <section aria-labelledby="sums-heading">
      <h2 id="sums-heading">Sums</h2>
      {sums.length === 0 && (
        <p>A sum draws phasors tip to tail and works out their exact resultant.</p>
      )}
      {sums.map((sum, index) => (
        <SumEditor
          key={sum.id}
          sheet={sheet}
          sum={sum}
          chosen={sum.id === chosen || (index === 0 && sums.length === 1)}
        />
      ))}
      <div className="verbs after">
        <button type="button" className="verb" onClick={add} disabled={sheet.phasors.length === 0}>
          Add sum
        </button>
      </div>
    </section>
  )
}
