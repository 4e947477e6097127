import {
  type Id,
  type Phasor,
  parseSheet,
  type Quantity,
  type Reading,
  type Sheet,
} from '../../src/sheet'

/** A sheet of these parts. Throws where they make no valid one. */
export function sheetOf(parts: Partial<Sheet>): Sheet {
  const parsed = parseSheet({
    format: 'phasogon-sheet',
    version: 1,
    title: '',
    phasors: [],
    ...parts,
  })
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors))
  return parsed.sheet
}

/** A phasor that is not typed, called by its id. */
export function phasor(id: Id, quantity: Quantity = 'voltage'): Phasor {
  return { id, label: id, quantity }
}

/** A phasor typed by these digits. */
export function polar(
  id: Id,
  magnitude: string,
  angle: string,
  quantity: Quantity = 'voltage',
): Phasor {
  return {
    ...phasor(id, quantity),
    magnitude: { value: Number(magnitude), text: magnitude },
    angle: { value: Number(angle), text: angle },
  }
}

/** A phasor typed by its real and imaginary part. */
export function rectangular(
  id: Id,
  real: string,
  imaginary: string,
  quantity: Quantity = 'voltage',
): Phasor {
  return {
    ...phasor(id, quantity),
    real: { value: Number(real), text: real },
    imaginary: { value: Number(imaginary), text: imaginary },
  }
}

/** The reading with this id. Throws where there is none. */
export function readingOf(sheet: Sheet, id: Id): Reading {
  const found = (sheet.readings ?? []).find((reading) => reading.id === id)
  if (found === undefined) throw new Error(`there is no reading ${id}`)
  return found
}

/** The phasor with this id. Throws where there is none. */
export function phasorOf(sheet: Sheet, id: Id): Phasor {
  const found = sheet.phasors.find((other) => other.id === id)
  if (found === undefined) throw new Error(`there is no phasor ${id}`)
  return found
}
