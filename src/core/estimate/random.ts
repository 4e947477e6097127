/** A source of numbers in 0 … 1 (1 left out) that a seed settles: the same seed, the same numbers. */
export type Random = () => number

const TWO_TO_32 = 2 ** 32

/** Numbers from a seed (splitmix32: a Weyl sequence, its bits mixed; from memory). */
export function createRandom(seed: number): Random {
  let state = seed >>> 0
  return () => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = state ^ (state >>> 16)
    mixed = Math.imul(mixed, 0x21f0aaad)
    mixed ^= mixed >>> 15
    mixed = Math.imul(mixed, 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / TWO_TO_32
  }
}

/** A deviate of the standard normal distribution (Box and Muller). */
export function normalDeviate(random: Random): number {
  return Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random())
}

/** A deviate of a rectangular distribution with standard deviation 1: within ± √3. */
export function rectangularDeviate(random: Random): number {
  return Math.sqrt(3) * (2 * random() - 1)
}
