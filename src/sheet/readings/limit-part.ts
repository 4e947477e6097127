/** One independent cause of error of a reading, in the unit of what the reading comes to. */
export interface LimitPart {
  /** In a few words: "3 digits". */
  readonly name: string
  /** Half a width, where the error lies within it for certain. */
  readonly limit?: number
  /** Standard uncertainty: limit / √3, or that of a mean of repeats. */
  readonly uncertainty: number
  readonly shape: 'rectangular' | 'normal'
  /** Degrees of freedom, where it comes from repeats. */
  readonly freedom?: number
}

/** A share of an error that several readings have in common. */
export interface SharedLimitPart extends LimitPart {
  /** The same for all readings that have the error in common: `gain:m1:voltage:600`. */
  readonly error: string
  /** By how much one standard uncertainty of the error moves what this reading comes to, signed. */
  readonly sensitivity: number
  /** Errors of one group come from one set of repeats and count as one cause. */
  readonly group?: string
}

/** A limit that is smaller has no square that a computer can hold: it counts as exact. */
const LEAST = 1e-150

/** An error that lies within a limit for certain. */
export function withinLimit(name: string, limit: number): LimitPart {
  const uncertainty = limit < LEAST ? 0 : limit / Math.sqrt(3)
  return { name, limit, uncertainty, shape: 'rectangular' }
}

/** The share of a common error that lies within a limit for certain; `move` is signed. */
export function sharedWithinLimit(name: string, error: string, move: number): SharedLimitPart {
  return {
    ...withinLimit(name, Math.abs(move)),
    error,
    sensitivity: move / Math.sqrt(3),
  }
}
