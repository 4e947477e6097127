/**
 * What someone typed. `text` keeps the digits as typed ("23.40" shows hundredths) and always agrees
 * with `value`. The true value lies within ± `limit` for certain: 0 is exact; omitted, it was not stated.
 */
export interface Typed {
  readonly value: number
  readonly text?: string
  readonly limit?: number
}
