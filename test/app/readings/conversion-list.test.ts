import { expect, test } from 'vitest'
import { conversions } from '../../../src/app/readings/conversion-list'

function converted(name: string, ...texts: readonly string[]): string {
  const found = conversions.find((each) => each.name === name)
  if (found === undefined) throw new Error(`there is no conversion ${name}`)
  expect(texts).toHaveLength(found.inputs.length)
  return found.convert(texts)
}

test('figures that are not on the sheet are converted, each in words', () => {
  expect(converted('time shift to degrees', '1.3', '8')).toBe('58.5°')
  expect(converted('ellipse to degrees', '2', '4')).toBe(
    '30.0° as it rises to the right, 150.0° as it falls',
  )
  expect(converted('watts to an angle', '115', '230', '1')).toBe('60.0°, lead or lag not shown')
  expect(converted('peak to rms', '34')).toBe('24.04')
  expect(converted('peak to peak to rms', '68')).toBe('24.04')
  expect(converted('averaging meter on another wave', '5')).toBe(
    '4.502 on a square wave, 5.198 on a triangle',
  )
})

test('nonsense is caught in words, and nothing is said while a figure is missing', () => {
  expect(converted('time shift to degrees', '9', '8')).toBe('The shift is longer than the period.')
  expect(converted('time shift to degrees', '9', '')).toBe('')
  expect(converted('time shift to degrees', '1', '0')).toBe('A period is more than nothing.')
  expect(converted('ellipse to degrees', '4.1', '4')).toBe('The intercept is above the height.')
  expect(converted('watts to an angle', '300', '230', '1')).toBe(
    'There are more watts than volts times amperes.',
  )
  expect(converted('peak to rms', 'high')).toMatch(/^Peak: .*not a number/)
})

test('every conversion has its formula', () => {
  for (const { name, formula } of conversions) expect(formula, name).toMatch(/=/)
})
