import type { Id } from '../types'

/** Something about a reading or an instrument that a careful eye would stop at. */
export interface Remark {
  /** The id of what it is about. */
  readonly about: Id
  /** One or two whole sentences. */
  readonly text: string
}
