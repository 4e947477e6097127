/**
 * The names of all fields of the schema, in the order in which they are written: saved files then
 * differ only where the sheets differ, and the link's dictionary meets its strings as it expects them.
 */
export const FIELD_ORDER: readonly string[] = `
  format version title revision job
  id of label kind quantity
  paper orientation origin unitsPerCentimetre tolerance
  frequency reference supply assumed drift
  phasors readings instruments channels sums elements
  number site circuit conditions testedBy checkedBy checkedDate approvedBy approvedDate voided
  threePhase chosen hand drawing report
  mistake original by date reason notes
  hazards hazard control risk supervision criterion conclusion
  phasor sum stands from to tail tipOf magnitude angle real imaginary sign
  terms equals arrangement start
  name serial calibrationDue category responding angles inputResistance accuracy
  connection wires neutral names currents
  shown shift period intercept height tilt form with against sense
  ratio turns shunt phaseError reversed
  instrument channel currentChannel range
  value text limit repeats pass struck corrected
  voltage current impedance power other
  resistance inductance dcResistance capacitance reactance rating marked
  percent millimetres degrees elementPercent
  element series parallel x y
`
  .trim()
  .split(/\s+/)

const RANK: ReadonlyMap<string, number> = new Map(FIELD_ORDER.map((name, rank) => [name, rank]))

/** A correction keeps the reading as it was, in its own order. */
const KEPT_AS_IT_IS = 'original'

/**
 * A copy of a JSON value in one canonical form: known fields in their order, then the unknown ones as
 * they came, word for word; zero without a sign, since JSON text does not keep one reliably.
 */
export function toCanonical<Value>(value: Value): Value
export function toCanonical(value: unknown): unknown {
  if (Array.isArray(value)) return value.map((item: unknown) => toCanonical(item))
  if (typeof value !== 'object' || value === null) return value === 0 ? 0 : value
  const copy: Record<string, unknown> = {}
  for (const [key, item] of Object.entries(value).sort(byRank)) {
    copy[key] = RANK.has(key) && key !== KEPT_AS_IT_IS ? toCanonical(item) : verbatimCopy(item)
  }
  return copy
}

function byRank([a]: readonly [string, unknown], [b]: readonly [string, unknown]): number {
  return (RANK.get(a) ?? RANK.size) - (RANK.get(b) ?? RANK.size)
}

function verbatimCopy(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(verbatimCopy)
  if (typeof value !== 'object' || value === null) return value === 0 ? 0 : value
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, verbatimCopy(item)]))
}
