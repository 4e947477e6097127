import fc from 'fast-check'

/** A repeatable stream of numbers in [0, 1): a long column of terms costs fast-check one seed. */
export function createRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    // The 32-bit mixer of Tommy Ettinger's mulberry32, public domain.
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
}

/** The items in an order drawn from a stream. */
export function shuffled<Item>(items: readonly Item[], random: () => number): readonly Item[] {
  return items
    .map((item) => ({ item, place: random() }))
    .sort((one, other) => one.place - other.place)
    .map(({ item }) => item)
}

/** Finite doubles of any size that a meter could show and then some. */
export const size = fc.double({ min: 1e-12, max: 1e12, noNaN: true })

/** Below this a double has not all its digits, or its square has not: no meter and no source goes there. */
const SMALLEST = 1e-100

function withoutTraces(value: number): number {
  return Math.abs(value) < SMALLEST ? 0 : value
}

/** Finite doubles of either sign, and 0. */
export const finite = fc.double({ min: -1e12, max: 1e12, noNaN: true }).map(withoutTraces)

/** Angles in degrees, also many turns away. */
export const degrees = fc.oneof(
  fc.double({ min: -180, max: 180, noNaN: true }).map(withoutTraces),
  fc.double({ min: -1e6, max: 1e6, noNaN: true }).map(withoutTraces),
  fc.integer({ min: -720, max: 720 }),
)
