import type { Phasor, Quantity, Reading, Sheet } from '../../../src/sheet'

/** A sheet with what is given, the rest left empty. */
export function sheetWith(parts: Partial<Sheet> & Pick<Sheet, 'phasors'>): Sheet {
  return { format: 'phasogon-sheet', version: 1, title: 'A job', ...parts }
}

/** A phasor of which nothing is typed. */
export function phasor(id: string, quantity: Quantity = 'voltage'): Phasor {
  return { id, label: id, quantity }
}

/** A phasor typed polar, exactly. */
export function exact(
  id: string,
  magnitude: number,
  angle: number,
  quantity: Quantity = 'voltage',
): Phasor {
  return {
    id,
    label: id,
    quantity,
    magnitude: { value: magnitude, limit: 0 },
    angle: { value: angle, limit: 0 },
  }
}

let count = 0

/** A magnitude reading with a limit, under an id of its own. */
export function reads(of: string, shown: number, limit?: number, id?: string): Reading {
  count += 1
  return {
    id: id ?? `m${count}`,
    of,
    kind: 'magnitude',
    shown,
    ...(limit === undefined ? {} : { limit }),
  }
}
