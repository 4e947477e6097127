import { parseNumber } from '../../core'
import { fingerprintOf, type Job } from '../../sheet'
import type { Earlier } from '../keep/earlier'
import { useEarlier } from '../keep/useEarlier'
import { usePage, usePageStore } from '../store'
import { Field } from './Field'
import { VoidedSignatures } from './VoidedSignatures'
import './title.css'

interface JobField {
  readonly field: Exclude<keyof Job, 'voided'>
  readonly caption: string
  readonly type?: 'date'
  readonly offers?: keyof Omit<Earlier, 'instruments'>
}

const jobFields: readonly JobField[] = [
  { field: 'number', caption: 'Job number' },
  { field: 'site', caption: 'Site', offers: 'sites' },
  { field: 'circuit', caption: 'Circuit', offers: 'circuits' },
  { field: 'conditions', caption: 'Conditions', offers: 'conditions' },
  { field: 'testedBy', caption: 'Tested by', offers: 'people' },
  { field: 'date', caption: 'Date of the test', type: 'date' },
  { field: 'checkedBy', caption: 'Checked by', offers: 'people' },
  { field: 'checkedDate', caption: 'Checked on', type: 'date' },
  { field: 'approvedBy', caption: 'Approved by', offers: 'people' },
  { field: 'approvedDate', caption: 'Approved on', type: 'date' },
]

/** The fields of the title block, to be typed; what is empty is not printed. */
export function TitleFields() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const earlier = useEarlier()
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
    <>
      <div className="fields">
        {jobFields.map(({ field, caption, type, offers }) => (
          <Field
            key={field}
            caption={caption}
            type={type ?? 'text'}
            value={sheet.job?.[field] ?? ''}
            offers={offers && earlier[offers]}
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
      <VoidedSignatures sheet={sheet} />
      <p className="fingerprint">
        Fingerprint of the data <output>{fingerprintOf(sheet)}</output>. It is printed on the
        report: whoever has the same sheet finds the same one, and any change gives another.
        Signatures and paper are left out of it.
      </p>
    </>
  )
}
