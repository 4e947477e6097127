/** What kind of quantity a phasor is. */
export type Quantity = 'voltage' | 'current' | 'impedance' | 'power' | 'other'

const UNITS: { readonly [quantity in Quantity]: string } = {
  voltage: 'V',
  current: 'A',
  impedance: 'Ω',
  power: 'VA',
  other: '',
}

/** The SI unit in which phasors of a quantity are kept and shown; empty where there is none. */
export function unitOf(quantity: Quantity): string {
  return UNITS[quantity]
}

/** The prefixes that figures are printed with, by their power of ten. */
const PRINTED_PREFIXES = new Map([
  [-12, 'p'],
  [-9, 'n'],
  [-6, 'µ'],
  [-3, 'm'],
  [0, ''],
  [3, 'k'],
  [6, 'M'],
  [9, 'G'],
  [12, 'T'],
])

/** The Greek letter, which looks like the micro sign µ. */
const GREEK_MU = '\u03bc'

/** The letters that are read as a prefix: both signs for micro, u for it, and K for kilo besides. */
const READ_PREFIXES = new Map([
  ...[...PRINTED_PREFIXES].map(([exponent, letter]) => [letter, exponent] as const),
  [GREEK_MU, -6],
  ['u', -6],
  ['K', 3],
])

/** The letters that are read as a prefix, for use inside a character class. */
export const PREFIX_LETTERS = [...READ_PREFIXES.keys()].join('')

/** The prefix of a power of ten from −12 to 12 in steps of three. */
export function prefixOf(exponent: number): string | undefined {
  return PRINTED_PREFIXES.get(exponent)
}

/** The power of ten that a prefix stands for: −3 for m. */
export function exponentOfPrefix(prefix: string): number | undefined {
  return READ_PREFIXES.get(prefix)
}

const ONLY_WHOLE: ReadonlySet<string> = new Set(['', '°', 'rad', '%', 'mm'])

/** Whether figures in this unit carry an SI prefix: kV, but no kilodegrees. */
export function takesPrefix(unit: string): boolean {
  return !ONLY_WHOLE.has(unit)
}

/** The sign of its own that some keyboards give for the letter Ω. */
const OHM_SIGN = '\u2126'

/** How each unit may be written; one letter in the other case is let pass where it means nothing else. */
const WRITTEN: { readonly [unit: string]: readonly string[] } = {
  V: ['V', 'v', 'volt', 'volts'],
  A: ['A', 'a', 'amp', 'amps', 'ampere', 'amperes'],
  Ω: ['Ω', OHM_SIGN, 'R', 'ohm', 'Ohm', 'ohms', 'Ohms'],
  VA: ['VA', 'va'],
  W: ['W', 'w', 'watt', 'watts'],
  var: ['var', 'VAr', 'VAR', 'vars'],
  Hz: ['Hz', 'hz', 'HZ'],
  H: ['H', 'henry'],
  F: ['F', 'farad'],
  s: ['s', 'sec', 'second', 'seconds'],
  mm: ['mm'],
  '°': ['°', 'º', '˚', 'deg', 'degs', 'degree', 'degrees'],
  rad: ['rad', 'rads', 'radian', 'radians'],
  '%': ['%'],
}

const UNIT_OF_WORD = new Map(
  Object.entries(WRITTEN).flatMap(([unit, words]) => words.map((word) => [word, unit] as const)),
)

/** What a word after a figure says: a power of ten, a unit, or both. */
export interface UnitWord {
  readonly exponent: number
  /** Left out where the word is a prefix alone: the k of 1.5k. */
  readonly unit?: string
}

/** What a word such as mV, V, k or deg stands for; undefined where it is none that the program knows. */
export function maybeUnitWord(word: string): UnitWord | undefined {
  const whole = UNIT_OF_WORD.get(word)
  if (whole !== undefined) return { exponent: 0, unit: whole }
  const exponent = exponentOfPrefix(word.slice(0, 1))
  if (exponent === undefined) return undefined
  if (word.length === 1) return { exponent }
  const unit = UNIT_OF_WORD.get(word.slice(1))
  return unit !== undefined && takesPrefix(unit) ? { exponent, unit } : undefined
}
