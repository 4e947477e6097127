import { formatQuantity, formatRectangular, resolutionOf } from '../../core'
import {
  type CircuitElement,
  predictingValue,
  type Typed,
  unitOfElementValue,
  valuesOfKind,
} from '../../sheet'

/**
 * What an element is marked with, or else was typed or measured for it: `8.2 Ω, 150 mH`; empty where
 * nothing is known.
 */
export function valueText(element: CircuitElement): string {
  if (element.kind === 'impedance') return impedanceText(element)
  return valuesOfKind(element.kind)
    .flatMap((value) => {
      const typed = predictingValue(element, value)
      return typed ? [formatTyped(typed, unitOfElementValue(value))] : []
    })
    .join(', ')
}

/** A figure with its unit, as finely as it was typed: `16 µF`. */
export function formatTyped(typed: Typed, unit: string): string {
  return formatQuantity(typed.value, unit, digitsOf(typed))
}

function digitsOf({ value, text }: Typed): { readonly resolution?: number } {
  const resolution = resolutionOf(text ?? String(value))
  return resolution === undefined ? {} : { resolution }
}

function impedanceText(element: CircuitElement): string {
  const resistance = predictingValue(element, 'resistance')
  const reactance = predictingValue(element, 'reactance')
  const known = [resistance, reactance].filter((typed) => typed !== undefined)
  if (known.length === 0) return ''
  const places = known.flatMap((typed) => digitsOf(typed).resolution ?? [])
  return formatRectangular(
    { re: resistance?.value ?? 0, im: reactance?.value ?? 0 },
    'Ω',
    places.length === known.length ? { resolution: Math.min(...places) } : {},
  )
}
