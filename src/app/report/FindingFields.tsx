import { LongField } from '../details/LongField'
import { tryEdit } from '../readings/commit'
import { usePage, usePageStore } from '../store'

const fields = [
  {
    field: 'criterion',
    caption: 'Criterion',
    placeholder: 'What must hold for the readings to be accepted',
  },
  {
    field: 'conclusion',
    caption: 'Conclusion',
    placeholder: 'What was found, and what follows from it',
  },
] as const

/** The criterion and the conclusion of the report, in the tester's own words. */
export function FindingFields() {
  const store = usePageStore()
  const report = usePage((state) => state.history.sheet.report)
  return (
    <div className="stacked">
      {fields.map(({ field, caption, placeholder }) => (
        <LongField
          key={field}
          caption={caption}
          placeholder={placeholder}
          value={report?.[field] ?? ''}
          onCommit={(text) =>
            tryEdit(store, { kind: 'set-report', report: { [field]: text === '' ? null : text } })
          }
        />
      ))}
    </div>
  )
}
