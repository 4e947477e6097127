import { formatQuantity } from '../core'

/** A figure that someone stated, with its unit and as many digits as it has: `10 kΩ`, `0.15 H` is `150 mH`. */
export function plainFigure(value: number, unit: string): string {
  if (value === 0) return formatQuantity(0, unit)
  const [figures = '', exponent = '0'] = Math.abs(value).toExponential().split('e')
  const decimals = figures.length > 1 ? figures.length - 2 : 0
  const last = Number(exponent) - decimals
  // No digit above the unit, so that 50 V is not printed as 0.05 kV.
  const unitOfPrefix = 3 * Math.floor(Number(exponent) / 3)
  return formatQuantity(value, unit, { resolution: Number(`1e${Math.min(last, unitOfPrefix)}`) })
}
