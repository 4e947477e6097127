/** A labelled choice among a few words, or none of them. */
export function ChoiceField<Choice extends string>(properties: {
  readonly caption: string
  readonly value: Choice | undefined
  readonly choices: { readonly [choice in Choice]: string }
  readonly onChoose: (choice: Choice | undefined) => void
}) {
  const { caption, value, choices, onChoose } = properties
  const names = Object.keys(choices) as Choice[]
  return (
    <label className="field">
      {caption}
      <select
        value={value ?? ''}
        onChange={({ target }) => onChoose(names.find((name) => name === target.value))}
      >
        <option value="">not said</option>
        {names.map((name) => (
          <option key={name} value={name}>
            {choices[name]}
          </option>
        ))}
      </select>
    </label>
  )
}
