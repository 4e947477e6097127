import type { Phasor, Quantity, Sheet, Sum, Term } from '../../src/sheet'

/** A phasor typed polar, its digits kept. */
export function phasor(
  id: string,
  magnitude: string,
  angle: string,
  quantity: Quantity = 'voltage',
): Phasor {
  return {
    id,
    label: id,
    quantity,
    magnitude: { value: Number(magnitude), text: magnitude },
    angle: { value: Number(angle), text: angle },
  }
}

/** A sheet with these parts and nothing else. */
export function sheetOf(phasors: readonly Phasor[], rest: Partial<Sheet> = {}): Sheet {
  return { format: 'phasogon-sheet', version: 1, title: 'Test', phasors, ...rest }
}

/** A sum of these phasors; `−V1` is a negative term. */
export function sum(id: string, terms: readonly string[], rest: Partial<Sum> = {}): Sum {
  return { id, terms: terms.map(termOf), ...rest }
}

function termOf(text: string): Term {
  return text.startsWith('−') ? { phasor: text.slice(1), sign: -1 } : { phasor: text }
}

/** An invented job: the auxiliary winding of a fan, whose voltages add up to the supply's, nearly. */
export const fan = sheetOf(
  [
    { ...phasor('I', '1.62', '0', 'current'), label: 'I' },
    { ...phasor('VR', '18.5', '0'), label: 'VR' },
    { ...phasor('VL', '57.3', '74.6'), label: 'Vcoil' },
    { ...phasor('VC', '31.0', '-90'), label: 'VC' },
    { ...phasor('VS', '41.6', '34.9'), label: 'VS' },
  ],
  {
    title: 'Roof fan 4, auxiliary winding',
    revision: 'B',
    reference: 'I',
    frequency: { value: 50, text: '50' },
    job: {
      number: 'W-2207',
      site: 'North hall',
      circuit: 'Distribution board 3, way 12',
      testedBy: 'M. Lindqvist',
      checkedBy: 'A. Brandt',
      date: '2026-03-14',
    },
    sums: [sum('s1', ['VR', 'VL', 'VC'], { equals: 'VS' })],
  },
)
