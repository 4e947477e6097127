import { formatQuantity } from '../../core'
import type { Evaluation } from '../../sheet'

/** Where the circuit would be at resonance, as a sentence; undefined where nowhere, or where it is not known. */
export function resonanceText({ resonance }: Evaluation): string | undefined {
  if (resonance === undefined) return undefined
  const { frequency, quality, bandwidth } = resonance
  const hertz = (value: number) => formatQuantity(value, 'Hz', { digits: 3 })
  const figures = [
    ...(quality === undefined
      ? []
      : [`quality factor ${formatQuantity(quality, '', { digits: 3 })}`]),
    ...(bandwidth === undefined ? [] : [`bandwidth ${hertz(bandwidth)}`]),
  ]
  return `Resonance at ${[hertz(frequency), ...figures].join(', ')}.`
}
