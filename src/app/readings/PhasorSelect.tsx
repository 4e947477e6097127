import type { Id, Sheet } from '../../sheet'

/** A choice among the phasors of the sheet. `none` is what an empty choice means, where there is one. */
export function PhasorSelect(properties: {
  readonly sheet: Sheet
  readonly name: string
  readonly value: Id | undefined
  readonly none?: string
  readonly without?: Id
  readonly onChoose: (id: Id | undefined) => void
}) {
  const { sheet, name, value, none, without, onChoose } = properties
  return (
    <select
      aria-label={name}
      value={value ?? ''}
      onChange={({ target }) => onChoose(target.value || undefined)}
    >
      {none !== undefined && <option value="">{none}</option>}
      {sheet.phasors
        .filter(({ id }) => id !== without)
        .map(({ id, label }) => (
          <option key={id} value={id}>
            {label || id}
          </option>
        ))}
    </select>
  )
}
