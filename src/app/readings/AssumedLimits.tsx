import { assumedOf, type Sheet } from '../../sheet'
import { Field } from '../details/Field'
import { usePageStore } from '../store'
import { maybeNumber, tryEdit } from './commit'

/** The one place in which the limits are changed that nobody stated, and how far the supply may drift. */
export function AssumedLimits({ sheet }: { readonly sheet: Sheet }) {
  const store = usePageStore()
  const usual = assumedOf(sheet)

  const commit = (part: 'percent' | 'degrees', unit: string, text: string): string | undefined => {
    const parsed = maybeNumber(text, unit)
    if (!parsed.ok) return parsed.problem
    const { [part]: _, ...others } = sheet.assumed ?? {}
    const assumed = parsed.value === null ? others : { ...others, [part]: parsed.value }
    return tryEdit(store, {
      kind: 'set-details',
      assumed: Object.keys(assumed).length === 0 ? null : assumed,
    })
  }

  return (
    <details>
      <summary>{`Assumed limits: ${usual.percent} % and ${usual.degrees}° where none is stated`}</summary>
      <div className="fields">
        <Field
          caption="Assumed of magnitudes and powers, in %"
          value={sheet.assumed?.percent?.toString() ?? ''}
          placeholder={`${usual.percent}`}
          onCommit={(text) => commit('percent', '%', text)}
        />
        <Field
          caption="Assumed of angles, in degrees"
          value={sheet.assumed?.degrees?.toString() ?? ''}
          placeholder={`${usual.degrees}`}
          onCommit={(text) => commit('degrees', '°', text)}
        />
        <Field
          caption="Drift of the supply between passes, in %"
          value={sheet.drift?.toString() ?? ''}
          placeholder="none"
          onCommit={(text) => {
            const parsed = maybeNumber(text, '%')
            if (!parsed.ok) return parsed.problem
            return tryEdit(store, { kind: 'set-details', drift: parsed.value })
          }}
        />
      </div>
    </details>
  )
}
