import { parseNumber } from '../../core'
import type { Job } from '../../sheet'
import { usePage, usePageStore } from '../store'
import { Field } from './Field'

const jobFields: readonly (readonly [Exclude<keyof Job, 'voided'>, string])[] = [
  ['number', 'Job number'],
  ['site', 'Site'],
  ['circuit', 'Circuit'],
  ['conditions', 'Conditions'],
  ['testedBy', 'Tested by'],
  ['checkedBy', 'Checked by'],
  ['approvedBy', 'Approved by'],
  ['date', 'Date of the test'],
]

/** What the title block of the sheet says, to be typed; what is empty is not printed. */
export function TitleBlock() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const { edit } = store.getState()

  const commitFrequency = (text: string): string | undefined => {
    if (text === '') {
      edit({ kind: 'set-details', frequency: null })
      return undefined
    }
    const parsed = parseNumber(text, { unit: 'Hz' })
    if (!parsed.ok) return parsed.problem
    if (parsed.value.value < 0) return 'A frequency is not negative: type it in hertz, such as 50.'
    edit({ kind: 'set-details', frequency: parsed.value })
    return undefined
  }

  return (
    <details>
      <summary>Title block</summary>
      <div className="fields">
        {jobFields.map(([field, caption]) => (
          <Field
            key={field}
            caption={caption}
            type={field === 'date' ? 'date' : 'text'}
            value={sheet.job?.[field] ?? ''}
            onCommit={(text) => {
              edit({ kind: 'set-job', job: { [field]: text === '' ? null : text } })
              return undefined
            }}
          />
        ))}
        <Field
          caption="Revision"
          value={sheet.revision ?? ''}
          onCommit={(text) => {
            edit({ kind: 'set-details', revision: text === '' ? null : text })
            return undefined
          }}
        />
        <Field
          caption="Frequency in Hz"
          value={sheet.frequency?.text ?? sheet.frequency?.value.toString() ?? ''}
          onCommit={commitFrequency}
        />
      </div>
    </details>
  )
}
