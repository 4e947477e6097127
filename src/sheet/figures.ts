import { type Quantity, type Typed, unitOf } from '../core'
import type { FigureUnit } from './digits'
import type { Reading, Sheet, Shown } from './types'

/** A value that someone typed, where it stands and in which unit. */
export interface TypedFigure {
  readonly path: string
  readonly typed: Typed
  readonly unit: FigureUnit
}

/** A figure that a display showed, the field it stands in and its unit. */
export interface ShownFigure {
  readonly field: string
  readonly shown: Shown
  readonly unit: FigureUnit
}

/** Every typed value of a sheet. */
export function* typedFigures(sheet: Sheet): Generator<TypedFigure> {
  yield* figuresIn(sheet, '', { frequency: 'Hz' })
  for (const [index, phasor] of sheet.phasors.entries()) {
    const unit = unitOf(phasor.quantity)
    const units = { magnitude: unit, angle: '°', real: unit, imaginary: unit }
    yield* figuresIn(phasor, `phasors[${index}].`, units)
  }
  for (const [index, instrument] of (sheet.instruments ?? []).entries()) {
    yield* figuresIn(instrument, `instruments[${index}].`, { inputResistance: 'Ω' })
  }
  for (const [index, channel] of (sheet.channels ?? []).entries()) {
    yield* figuresIn(channel, `channels[${index}].`, { ratio: '', phaseError: '°' })
  }
  for (const [index, element] of (sheet.elements ?? []).entries()) {
    yield* figuresIn(element, `elements[${index}].`, UNITS_OF_ELEMENT)
    yield* figuresIn(element.marked ?? {}, `elements[${index}].marked.`, UNITS_OF_ELEMENT)
  }
}

const UNITS_OF_ELEMENT = {
  resistance: 'Ω',
  inductance: 'H',
  dcResistance: 'Ω',
  capacitance: 'F',
  reactance: 'Ω',
}

function* figuresIn<Field extends string>(
  part: { readonly [field in NoInfer<Field>]?: Typed },
  path: string,
  units: { readonly [field in Field]: FigureUnit },
): Generator<TypedFigure> {
  for (const field in units) {
    const value = part[field]
    if (value !== undefined) yield { path: path + field, typed: value, unit: units[field] }
  }
}

/**
 * The figures of a reading as they were shown, each in its unit: that of the phasor's quantity for a
 * magnitude (volts where a shunt turns it into a current), the instrument's own for the others.
 */
export function shownFigures(reading: Reading, quantity: Quantity): readonly ShownFigure[] {
  switch (reading.kind) {
    case 'magnitude':
      return [{ field: 'shown', shown: reading.shown, unit: unitOfMagnitude(reading, quantity) }]
    case 'angle':
      return [{ field: 'shown', shown: reading.shown, unit: '°' }]
    case 'shift':
      return [
        { field: 'shift', shown: reading.shift, unit: 's' },
        { field: 'period', shown: reading.period, unit: 's' },
      ]
    case 'ellipse':
      return [
        { field: 'intercept', shown: reading.intercept, unit: '' },
        { field: 'height', shown: reading.height, unit: '' },
      ]
    case 'power':
      return [{ field: 'shown', shown: reading.shown, unit: 'W' }]
    case 'reactive-power':
      return [{ field: 'shown', shown: reading.shown, unit: 'var' }]
    case 'power-factor':
      return [{ field: 'shown', shown: reading.shown, unit: '' }]
  }
}

/** The unit in which a magnitude was shown: volts across a shunt, else the phasor's own. */
export function unitOfMagnitude(reading: { readonly shunt?: number }, quantity: Quantity): string {
  return reading.shunt === undefined ? unitOf(quantity) : 'V'
}
