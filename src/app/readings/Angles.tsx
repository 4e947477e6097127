import { differenceDegrees } from '../../core'
import { angleSentence, type Evaluation, referenceOf, type Sheet } from '../../sheet'

/** Every angle of the sheet against its reference, each as a sentence. */
export function Angles({
  sheet,
  evaluation,
}: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation
}) {
  const reference = referenceOf(sheet)
  const origin = evaluation.phasors.find(({ id }) => id === reference)?.angle ?? 0
  const sentences = evaluation.phasors.flatMap(({ id, angle }) => {
    if (angle === undefined || id === reference) return []
    const lead = differenceDegrees(angle, origin)
    return [{ id, text: `${angleSentence(sheet, id, reference, lead)}.` }]
  })
  if (sentences.length === 0) return null
  return (
    <details>
      <summary>Every angle in words</summary>
      <ul className="reckoning">
        {sentences.map(({ id, text }) => (
          <li key={id}>{text}</li>
        ))}
      </ul>
    </details>
  )
}
