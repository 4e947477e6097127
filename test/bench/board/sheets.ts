import type { Phasor, Sheet } from '../../../src/sheet'

/** Phasors of a fixed pattern, without chance, so that every run measures the same picture. */
function phasors(count: number, place: (index: number) => Partial<Phasor>): Phasor[] {
  return Array.from({ length: count }, (_, index) => ({
    id: `v${index}`,
    label: `V${index}`,
    quantity: 'voltage',
    magnitude: { value: 8 + ((index * 7) % 11) },
    angle: { value: ((index * 137) % 360) - 179 },
    ...place(index),
  }))
}

/** A sum of so many terms, tip to tail. */
export function chainSheet(count: number): Sheet {
  const all = phasors(count, () => ({}))
  return {
    format: 'phasogon-sheet',
    version: 1,
    title: `A chain of ${count}`,
    phasors: all,
    sums: [{ id: 's1', terms: all.map(({ id }) => ({ phasor: id })) }],
  }
}

/** So many phasors that hang on nothing, spread over the paper. */
export function looseSheet(count: number): Sheet {
  const all = phasors(count, (index) => ({
    tail: { x: 20 + ((index * 37) % 250), y: 20 + ((index * 53) % 165) },
  }))
  return {
    format: 'phasogon-sheet',
    version: 1,
    title: `${count} loose phasors`,
    phasors: all,
    drawing: { unitsPerCentimetre: { voltage: 20 } },
  }
}
