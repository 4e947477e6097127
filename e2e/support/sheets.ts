import type { Phasor, Sheet } from '../../src/sheet'

/** A sheet with what is given on it, and no more than a title besides. */
export function sheetOf(parts: Partial<Sheet> & { readonly phasors: readonly Phasor[] }): Sheet {
  return { format: 'phasogon-sheet', version: 1, title: 'Bench 4', ...parts }
}

/** A phasor that was typed, with its digits. */
export function typed(
  label: string,
  magnitude: string,
  angle: string,
  rest: Partial<Phasor> = {},
): Phasor {
  return {
    id: label,
    label,
    quantity: label.startsWith('I') ? 'current' : 'voltage',
    magnitude: { value: Number(magnitude), text: magnitude },
    angle: { value: Number(angle), text: angle },
    ...rest,
  }
}
