import type { Locator } from '@playwright/test'
import { expect } from './test'

/** A figure as it is printed: its value, and how far rounding may have moved it. */
interface Printed {
  readonly value: number
  readonly rounding: number
}

const factors: { readonly [prefix: string]: number } = { k: 1e3, M: 1e6, m: 1e-3, µ: 1e-6 }

/** The figures in a text such as `48.34 V ∠ −58.9°` or `230 mV`, in SI units and in their order. */
export function figuresIn(text: string): readonly Printed[] {
  return [...text.matchAll(/([+−-]?)(\d+)(?:\.(\d+))?(?:\s([kMmµ])(?=[VAΩ]))?/gu)].map((found) => {
    const [, sign, whole, decimals = '', prefix = ''] = found
    const factor = factors[prefix] ?? 1
    const value = Number(`${whole}.${decimals || '0'}`) * factor
    return {
      value: sign === '−' || sign === '-' ? -value : value,
      rounding: 0.5 * factor * 10 ** -decimals.length,
    }
  })
}

/** Expects that the first figures of a text are these values, each rounded to the digits it shows. */
export function expectFigures(text: string, values: readonly number[]): void {
  const printed = figuresIn(text)
  expect(printed.length, `figures in “${text}”`).toBeGreaterThanOrEqual(values.length)
  values.forEach((value, at) => {
    const { value: shown, rounding } = printed[at] as Printed
    expect(Math.abs(shown - value), `“${text}” shows ${value}`).toBeLessThanOrEqual(
      rounding * (1 + 1e-9),
    )
  })
}

/** The text that an element holds now. */
export async function textOf(element: Locator): Promise<string> {
  return (await element.textContent()) ?? ''
}
