import { useState } from 'react'
import { conversions } from './conversion-list'

/** Conversions where people slip, each with its formula: for figures that are not on the sheet. */
export function Conversions() {
  const [chosen, setChosen] = useState(conversions[0]?.name ?? '')
  const [texts, setTexts] = useState<{ readonly [caption: string]: string }>({})
  const conversion = conversions.find(({ name }) => name === chosen)
  if (conversion === undefined) return null
  const answer = conversion.convert(conversion.inputs.map((caption) => texts[caption] ?? ''))
  return (
    <details>
      <summary>Conversions</summary>
      <div className="fields">
        <label className="field">
          Convert
          <select value={chosen} onChange={({ target }) => setChosen(target.value)}>
            {conversions.map(({ name }) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        </label>
        {conversion.inputs.map((caption) => (
          <label key={caption} className="field">
            {caption}
            <input
              value={texts[caption] ?? ''}
              onChange={({ target }) => setTexts({ ...texts, [caption]: target.value })}
            />
          </label>
        ))}
      </div>
      <output className="conversion">{answer}</output>
      <p className="reading-words">{conversion.formula}</p>
    </details>
  )
}
