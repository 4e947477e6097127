import { normalTwoSidedPoint, studentTwoSidedPoint } from './distributions'

/** One independent cause of uncertainty, and how much of a quantity's standard uncertainty it makes. */
export interface UncertaintyPart {
  /** Standard uncertainty that this cause alone gives the quantity, in the quantity's unit. */
  readonly uncertainty: number
  /** `rectangular`: from a limit that holds for certain; `normal`: from repeats or a certificate. */
  readonly shape: 'rectangular' | 'normal'
  /** Degrees of freedom of a part that comes from repeats; omitted: known for certain. */
  readonly freedom?: number
}

const OUTSIDE = 0.05
/** EA-4/02 M:2022, example S9 (from memory): the rest may be three tenths of the part that dominates. */
const REST_OF_DOMINANT = 0.3
/** 0.95 · √3 = 1.645, as EA-4/02 rounds it. */
const RECTANGULAR_FACTOR = 1.65
/** The normal 1.96, as the GUM rounds it (G.6.6). */
const USUAL_FACTOR = 2

/** The combined standard uncertainty of independent parts: the root of the sum of squares. */
export function combinedUncertainty(parts: readonly UncertaintyPart[]): number {
  return Math.hypot(...parts.map((part) => part.uncertainty))
}

/** Effective degrees of freedom by Welch and Satterthwaite (GUM G.4.1, formula G.2b); infinite without repeats. */
export function effectiveFreedom(parts: readonly UncertaintyPart[]): number {
  const combined = combinedUncertainty(parts)
  if (combined === 0) return Number.POSITIVE_INFINITY
  let sum = 0
  for (const { uncertainty, freedom } of parts) {
    if (freedom !== undefined) sum += (uncertainty / combined) ** 4 / freedom
  }
  return 1 / sum
}

function isOneRectangle(parts: readonly UncertaintyPart[]): boolean {
  let dominant: UncertaintyPart | undefined
  for (const part of parts) {
    if (dominant === undefined || part.uncertainty > dominant.uncertainty) dominant = part
  }
  if (dominant === undefined || dominant.shape !== 'rectangular') return false
  const rest = combinedUncertainty(parts.filter((part) => part !== dominant))
  return rest <= REST_OF_DOMINANT * dominant.uncertainty
}

/**
 * The factor that makes a standard uncertainty an expanded one, coverage 95 %. Exactly:
 * – 1.65 where the largest part is rectangular and all the others together come to no more than 0.3
 *   of it (EA-4/02, example S9);
 * – else Student's two-sided 95 % point for the effective degrees of freedom, which need not be
 *   whole (GUM G.4), where that is above 2: it is below some sixty degrees of freedom;
 * – else 2.
 */
export function coverageFactor(parts: readonly UncertaintyPart[]): number {
  if (isOneRectangle(parts)) return RECTANGULAR_FACTOR
  const freedom = effectiveFreedom(parts)
  if (freedom === Number.POSITIVE_INFINITY) return USUAL_FACTOR
  return Math.max(USUAL_FACTOR, studentTwoSidedPoint(OUTSIDE, Math.max(1, freedom)))
}

/** Expanded uncertainty, coverage 95 %: the combined standard uncertainty times the `coverageFactor`. */
export function expandedUncertainty(parts: readonly UncertaintyPart[]): number {
  return coverageFactor(parts) * combinedUncertainty(parts)
}

/** The normal two-sided 95 % point, 1.96: what a single normalised residual is held against. */
export const NORMAL_95 = normalTwoSidedPoint(OUTSIDE)
