import { describe, expect, test } from 'vitest'
import { type CircuitElement, foundBesideMark, type Typed } from '../../../src/sheet'
import { sheetOf } from '../sheets'

const place = { id: 'e', voltage: 'V', current: 'I' }
const micro = (value: number) => Number(`${value}e-6`)

function capacitor(marked: Typed): CircuitElement {
  return {
    ...place,
    id: 'C',
    kind: 'capacitor',
    label: 'run capacitor',
    marked: { capacitance: marked },
  }
}

function textOf(element: CircuitElement, value: string, found: number, expanded: number): string {
  const evaluation = { id: element.id, found: { [value]: { value: found, expanded } } }
  return foundBesideMark(sheetOf({}), element, evaluation).map(({ text }) => text)[0] ?? ''
}

function verdictOf(found: number, expanded: number) {
  const marked = { value: micro(16), text: '16 µF', limit: micro(0.8) }
  const evaluation = {
    id: 'C',
    found: { capacitance: { value: micro(found), expanded: micro(expanded) } },
  }
  return foundBesideMark(sheetOf({}), capacitor(marked), evaluation)[0]?.verdict
}

describe('what was found beside the mark', () => {
  test('is said in one sentence', () => {
    const marked = { value: micro(16), text: '16 µF', limit: micro(0.8) }
    expect(textOf(capacitor(marked), 'capacitance', micro(13.1), micro(0.3))).toBe(
      'run capacitor: 13.10 µF ± 0.30 µF found, 16 µF ± 5 % marked: below tolerance.',
    )
  })

  test('is within, below or above where all of its limit is', () => {
    expect(verdictOf(16, 0.3)).toBe('within')
    expect(verdictOf(15.5, 0.3)).toBe('within')
    expect(verdictOf(14.8, 0.3)).toBe('below')
    expect(verdictOf(17.2, 0.3)).toBe('above')
  })

  test('is undecided where the edge of the tolerance lies within its limit', () => {
    expect(verdictOf(15.1, 0.3)).toBe('undecided')
    expect(verdictOf(16.9, 0.3)).toBe('undecided')
    expect(verdictOf(16, 3)).toBe('undecided')
  })

  test('takes the assumed tolerance where none is stated, and says so', () => {
    expect(
      textOf(capacitor({ value: micro(16), text: '16 µF' }), 'capacitance', micro(16), micro(0.1)),
    ).toBe(
      'run capacitor: 16.00 µF ± 0.10 µF found, 16 µF ± 5 % (assumed) marked: within tolerance.',
    )
  })

  test('tells a prefix from a value that is simply off', () => {
    const coil = (marked: Typed): CircuitElement => ({
      ...place,
      id: 'coil',
      kind: 'coil',
      marked: { inductance: marked },
    })
    const henries = { value: 150, text: '150 H', limit: 7.5 }
    expect(textOf(coil(henries), 'inductance', 0.151, 0.002)).toBe(
      'coil, inductance: 151.0 mH ± 2.0 mH found, 150 H ± 5 % marked: below tolerance, by a factor of about 1000: look at the prefix of the mark.',
    )
    expect(textOf(coil({ value: 0.01, text: '10 mH' }), 'inductance', 0.4, 0.002)).toContain(
      'above tolerance, by a factor of about 40.',
    )
  })

  test('says what a dc resistance shows of a winding, and what not', () => {
    const coil: CircuitElement = {
      ...place,
      id: 'coil',
      kind: 'coil',
      dcResistance: { value: 11.2, limit: 0.1 },
      marked: { resistance: { value: 12, text: '12.0', limit: 0.6 } },
    }
    expect(textOf(coil, 'resistance', 12.1, 0.2)).toContain(
      'within tolerance; above the dc resistance, 11.20 Ω, by what iron, eddy currents and warmth add',
    )
    expect(textOf(coil, 'resistance', 11.25, 0.2)).toContain(
      'not told apart from the dc resistance',
    )
    expect(textOf(coil, 'resistance', 9, 0.2)).toContain('one of the two is wrong')
  })

  test('gives an impedance no verdict, since it is no constant', () => {
    const motor: CircuitElement = {
      ...place,
      kind: 'impedance',
      label: 'motor',
      marked: { resistance: { value: 30, limit: 1 } },
    }
    expect(textOf(motor, 'resistance', 90, 1)).toMatch(/30 Ω .* marked; no verdict/)
  })

  test('stands alone without a mark', () => {
    const lamp: CircuitElement = { ...place, kind: 'resistor', label: 'lamp' }
    expect(textOf(lamp, 'resistance', 529, 6)).toBe('lamp: 529.0 Ω ± 6.0 Ω found.')
  })
})
