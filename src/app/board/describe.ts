import { formatPolar, unitOf } from '../../core'
import { describeCircuit, formatScale, type Scene } from '../../drawing'
import type { Evaluation, Quantity, Sheet } from '../../sheet'

/** The picture in words, for those who do not see it: every phasor with its value, and the scale. */
export function describeBoard(sheet: Sheet, evaluation: Evaluation, scene: Scene): string {
  if (sheet.phasors.length === 0) return 'An empty sheet.'
  const phasors = sheet.phasors.map((phasor, index) => {
    const found = evaluation.phasors[index]
    const name = phasor.label || phasor.id
    if (found?.magnitude === undefined || found.angle === undefined) return `${name} open`
    return `${name} ${formatPolar({ magnitude: found.magnitude, angle: found.angle }, unitOf(phasor.quantity))}`
  })
  const scales = Object.entries(scene.unitsPerCentimetre).map(([quantity, scale]) =>
    formatScale(scale, quantity as Quantity),
  )
  const drawn = `${phasors.join('; ')}. Scale: ${scales.join(', ')}.`
  const circuit = describeCircuit(sheet)
  return circuit === '' ? drawn : `${drawn} Circuit: ${circuit}.`
}
