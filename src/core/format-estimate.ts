import { roundUp } from './format-limit'
import { powerOfTen } from './format-number'
import { formatAngle } from './format-phasor'
import { formatQuantity } from './format-quantity'

/** A limit below this share of a size is rounding: the value is exact. */
const ROUNDING = 1e-9
const HALF_TURN = 180

/** From a tenth to a thousand of the unit no prefix is needed. */
function plain(size: number): number {
  return size >= 0.1 && size < 1000 ? 1 : size
}

/**
 * A value and its limit in one unit, so that the two can be set side by side: 48.17 V ± 0.34 V,
 * 12.00 kV ± 0.18 kV, 34.7° ± 1.1°. The limit is rounded up to two digits, so that it never looks tighter
 * than it is, and the value to as many places. An exact value, with a limit of 0, stands alone, and so does one
 * whose limit is not known.
 *
 * @param like A size whose prefix is used for both. Unless stated, no prefix from a tenth to a thousand of the
 *   unit, as meters and tables have it.
 */
export function formatEstimate(
  value: number,
  limit: number | undefined,
  unit: string,
  like: number = plain(Math.max(Math.abs(value), limit ?? 0)),
): string {
  const print = (figure: number, resolution?: number) =>
    unit === '°'
      ? formatAngle(figure, { resolution })
      : formatQuantity(figure, unit, { resolution, like })
  const size = unit === '°' ? HALF_TURN : Math.abs(value)
  if (limit === undefined || !Number.isFinite(value) || limit <= ROUNDING * size)
    return print(value)
  const up = roundUp(limit)
  const [, exponent = '0'] = up.toExponential(1).split('e')
  const resolution = powerOfTen(Number(exponent) - 1)
  return `${print(value, resolution)} ± ${print(up, resolution)}`
}
