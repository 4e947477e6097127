import type { Sheet, VoidedSignature } from '../../sheet'

/** The signatures that no longer hold, kept readable; nothing where there is none. */
export function VoidedSignatures({ sheet }: { readonly sheet: Sheet }) {
  const { voided = [] } = sheet.job ?? {}
  if (voided.length === 0) return null
  return (
    <ul className="voided" aria-label="Voided signatures">
      {voided.map((signature) => (
        <li key={JSON.stringify(signature)}>{sentenceOf(signature)}</li>
      ))}
    </ul>
  )
}

function sentenceOf({ kind, by, date, revision }: VoidedSignature): string {
  const on = date === undefined ? '' : ` on ${date}`
  return `Void: ${kind} by ${by}${on}, revision ${revision?.trim() || '0'}. The sheet was changed after it.`
}
