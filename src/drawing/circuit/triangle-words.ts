import { type Complex, formatAngle, formatQuantity, magnitudeOf, toPolar } from '../../core'
import type { TriangleKind } from './triangle-subjects'

/** Digits of what a triangle shows. */
const DIGITS = { digits: 4 } as const

/** The three sides of a triangle: the symbol of each, and what stands beside it. */
export interface TriangleWords {
  readonly real: readonly [string, string]
  readonly imaginary: readonly [string, string]
  readonly whole: readonly [string, string]
}

/** What the sides of a triangle are called and come to. */
export function wordsOfTriangle(kind: TriangleKind, value: Complex): TriangleWords {
  const { re, im } = value
  const size = magnitudeOf(value)
  const text = (figure: number, unit: string) => formatQuantity(figure, unit, DIGITS)
  if (kind === 'impedance') {
    const { angle } = toPolar(value)
    return {
      real: ['R', text(re, 'Ω')],
      imaginary: ['X', text(im, 'Ω')],
      whole: ['Z', `${text(size, 'Ω')} ∠ ${formatAngle(angle)}`],
    }
  }
  return {
    real: ['P', `${text(re, 'W')}${re < 0 ? ', given back' : ''}`],
    imaginary: ['Q', text(im, 'var')],
    whole: ['S', `${text(size, 'VA')}, ${factorText(value)}`],
  }
}

function factorText(value: Complex): string {
  const size = magnitudeOf(value)
  if (size === 0) return 'no power factor'
  const factor = formatQuantity(value.re / size, '', { resolution: 0.001 })
  if (value.im === 0) return `power factor ${factor}`
  return `power factor ${factor}, the current ${value.im > 0 ? 'lags' : 'leads'}`
}
