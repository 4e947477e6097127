import type { Accuracy, Instrument } from '../types'

/**
 * The accuracy of an instrument that serves a reading: of the function; of the range that is named,
 * else of any range, else of the smallest range that holds what is shown. Undefined where there is none.
 */
export function accuracyRowOf(
  instrument: Instrument,
  of: Accuracy['of'],
  shown: number,
  range: number | undefined,
): Accuracy | undefined {
  const rows = (instrument.accuracy ?? []).filter((row) => row.of === of)
  const named = range === undefined ? undefined : rows.find((row) => row.range === range)
  const general = rows.find((row) => row.range === undefined)
  if (named !== undefined || general !== undefined || range !== undefined) return named ?? general
  return rows
    .filter((row) => (row.range ?? 0) >= Math.abs(shown))
    .reduce<Accuracy | undefined>(
      (least, row) => ((row.range ?? 0) < (least?.range ?? Number.POSITIVE_INFINITY) ? row : least),
      undefined,
    )
}

/** The unit in which a function is shown, and in which its accuracy may be stated. */
export const UNIT_OF_FUNCTION: { readonly [of in Accuracy['of']]: string } = {
  voltage: 'V',
  current: 'A',
  power: 'W',
  angle: '°',
  time: 's',
  resistance: 'Ω',
}
