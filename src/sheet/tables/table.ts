/** A table for a spreadsheet: figures are numbers, in SI units and degrees; what is not known is left out. */
export interface Table {
  /** What it lists, as it stands in a file name. */
  readonly name: 'schedule' | 'readings' | 'sums'
  readonly head: readonly string[]
  readonly rows: readonly (readonly Cell[])[]
}

/** A cell of a table. */
export type Cell = string | number | undefined

/** A figure that was worked out, without the noise of its last bits; no meter shows nine digits. */
export function worked(value: number | undefined): number | undefined {
  return value === undefined ? undefined : Number(value.toPrecision(9))
}
