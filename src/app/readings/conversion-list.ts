import {
  degreesOfEllipse,
  degreesOfPower,
  degreesOfShift,
  FORMULAS,
  formatAngle,
  formatNumber,
  parseNumber,
  rmsOfAverageResponding,
  rmsOfForm,
} from '../../core'

/** A conversion of a few figures, as it is offered beside the readings. */
export interface ConversionOffer {
  readonly name: string
  readonly inputs: readonly string[]
  readonly formula: string
  /** What typed texts come to, in words; what is missing or cannot be, where nothing comes of them. */
  readonly convert: (texts: readonly string[]) => string
}

function offer(
  name: string,
  inputs: readonly string[],
  formula: string,
  compute: (figures: readonly [number, number, number]) => string,
): ConversionOffer {
  const convert = (texts: readonly string[]): string => {
    const figures: number[] = []
    for (const [index, text] of texts.entries()) {
      if (text.trim() === '') return ''
      const parsed = parseNumber(text, { unit: '' })
      if (!parsed.ok) return `${inputs[index]}: ${parsed.problem}`
      figures.push(parsed.value.value)
    }
    const [first = 0, second = 0, third = 0] = figures
    return compute([first, second, third])
  }
  return { name, inputs, formula, convert }
}

function figure(value: number): string {
  return Number.isFinite(value) ? formatNumber(value, decimalsFor(value)) : 'That cannot be.'
}

/** Four significant digits. */
function decimalsFor(value: number): number {
  return value === 0 ? 0 : Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value))))
}

/** The conversions where people slip. */
export const conversions: readonly ConversionOffer[] = [
  offer('time shift to degrees', ['Shift', 'Period'], FORMULAS.shift, ([shift, period]) => {
    if (period <= 0) return 'A period is more than nothing.'
    if (Math.abs(shift) > period) return 'The shift is longer than the period.'
    return formatAngle(degreesOfShift(shift, period))
  }),
  offer(
    'ellipse to degrees',
    ['Intercept', 'Height'],
    'sin φ = intercept ÷ height',
    ([across, height]) => {
      if (height <= 0 || across < 0) return 'Both are widths on the screen: more than nothing.'
      if (across > height) return 'The intercept is above the height.'
      const rising = formatAngle(degreesOfEllipse(across, height, 'rising'))
      return `${rising} as it rises to the right, ${formatAngle(degreesOfEllipse(across, height, 'falling'))} as it falls`
    },
  ),
  offer(
    'watts to an angle',
    ['Watts', 'Volts', 'Amperes'],
    FORMULAS.power,
    ([power, voltage, current]) => {
      if (voltage * current <= 0) return 'Volts and amperes are more than nothing.'
      if (Math.abs(power) > voltage * current)
        return 'There are more watts than volts times amperes.'
      return `${formatAngle(degreesOfPower(power, voltage, current))}, lead or lag not shown`
    },
  ),
  offer('peak to rms', ['Peak'], FORMULAS.peak, ([peak]) => figure(peak * rmsOfForm('peak'))),
  offer('peak to peak to rms', ['Peak to peak'], FORMULAS['peak-to-peak'], ([whole]) =>
    figure(whole * rmsOfForm('peak-to-peak')),
  ),
  offer(
    'averaging meter on another wave',
    ['Shown'],
    FORMULAS['average-responding'],
    ([shown]) =>
      `${figure(rmsOfAverageResponding(shown, 'square'))} on a square wave, ${figure(rmsOfAverageResponding(shown, 'triangle'))} on a triangle`,
  ),
]
