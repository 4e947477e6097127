import LibraryComplex from 'complex.js'

/** A complex number, as plain data. */
export interface Complex {
  readonly re: number
  readonly im: number
}

/** 0 + j0. */
export const ZERO: Complex = { re: 0, im: 0 }

const UNDEFINED: Complex = { re: Number.NaN, im: Number.NaN }

/**
 * The library takes NaN for an infinity, so that NaN + 1 comes out infinite: whatever is not finite
 * leaves here as NaN. Adding 0 turns −0 into 0.
 */
function plain(z: Complex): Complex {
  return isFiniteComplex(z) ? { re: z.re + 0, im: z.im + 0 } : UNDEFINED
}

function toLibrary(z: Complex): LibraryComplex {
  return new LibraryComplex(z.re, z.im)
}

/** Whether both parts are finite. */
export function isFiniteComplex(z: Complex): boolean {
  return Number.isFinite(z.re) && Number.isFinite(z.im)
}

/** a + b. Both parts are NaN where an operand or the result is not finite. */
export function add(a: Complex, b: Complex): Complex {
  return plain(toLibrary(a).add(b.re, b.im))
}

/** a − b. Both parts are NaN where an operand or the result is not finite. */
export function subtract(a: Complex, b: Complex): Complex {
  return plain(toLibrary(a).sub(b.re, b.im))
}

/** a · b. Both parts are NaN where an operand or the result is not finite. */
export function multiply(a: Complex, b: Complex): Complex {
  return plain(toLibrary(a).mul(b.re, b.im))
}

/** a / b. Both parts are NaN where b is zero, or where an operand or the result is not finite. */
export function divide(a: Complex, b: Complex): Complex {
  if (!isFiniteComplex(a) || !isFiniteComplex(b)) return UNDEFINED
  return plain(toLibrary(a).div(b.re, b.im))
}

/** −z: the same phasor the other way round. */
export function negate(z: Complex): Complex {
  return plain({ re: -z.re, im: -z.im })
}

/** k · z for a real k. */
export function scaleBy(z: Complex, k: number): Complex {
  return plain({ re: k * z.re, im: k * z.im })
}

/** The complex conjugate: the angle with the other sign. */
export function conjugate(z: Complex): Complex {
  return plain({ re: z.re, im: -z.im })
}

const SQUARES_OVERFLOW = 1e150
const SQUARES_UNDERFLOW = 1e-140

/** |z|: whole where the parts are legs of a Pythagorean triple, and safe from overflow and underflow. */
export function magnitudeOf(z: Complex): number {
  const larger = Math.max(Math.abs(z.re), Math.abs(z.im))
  // The library squares whatever is below 1e8, so that a tiny phasor would have no length at all.
  if (larger > SQUARES_OVERFLOW || larger < SQUARES_UNDERFLOW) return Math.hypot(z.re, z.im)
  return Math.sqrt(z.re * z.re + z.im * z.im)
}
