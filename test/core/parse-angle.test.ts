import { describe, expect, it } from 'vitest'
import { parseAngle } from '../../src/core'

function problem(text: string): string {
  const result = parseAngle(text)
  if (result.ok) throw new Error(`${text} was read as ${result.value.value}`)
  return result.problem
}

describe('an angle', () => {
  it.each([
    ['82', 82],
    ['82°', 82],
    ['82 °', 82],
    ['82º', 82],
    ['-90', -90],
    ['−90°', -90],
    ['82.5 deg', 82.5],
    ['82,5 degrees', 82.5],
    ['1.5/10*360', 54],
    ['1.5m/10m*360', 54],
    ['0 rad', 0],
  ])('is read in degrees: %s', (text, value) => {
    expect(parseAngle(text)).toEqual({ ok: true, value: { value, text } })
  })

  it.each([
    ['1.43 rad', (1.43 * 180) / Math.PI],
    ['-0.5rad', (-0.5 * 180) / Math.PI],
    ['π/6 rad', 30],
    ['-π/2 rad', -90],
  ])('is read in radians where it says so: %s', (text, value) => {
    const result = parseAngle(text)
    expect(result.ok && result.value.value).toBeCloseTo(value, 12)
    expect(result.ok && result.value.text).toBe(text)
  })

  it.each([
    ['270', -90],
    ['-180', 180],
    ['360°', 0],
    ['-450', -90],
    ['720.5', 0.5],
  ])('is wrapped and keeps its digits: %s', (text, value) => {
    expect(parseAngle(text)).toEqual({ ok: true, value: { value, text } })
  })

  it.each([
    ['82 ± 1', '82', 1],
    ['82° ± 1°', '82°', 1],
    ['82 ± 0.5°', '82', 0.5],
    ['(82 ± 1)°', '82 °', 1],
  ])('may have a limit in degrees: %s', (text, kept, limit) => {
    expect(parseAngle(text)).toEqual({ ok: true, value: { value: 82, text: kept, limit } })
  })

  it('may have a limit in radians', () => {
    const result = parseAngle('1 rad ± 0.01 rad')
    expect(result.ok && result.value.limit).toBeCloseTo(0.572958, 6)
  })

  it.each([
    ['', 'Type a value, such as 82 or −90.'],
    ['5 V', 'An angle is in degrees or rad, so “V” does not fit: write 82° or 1.43 rad.'],
    ['5k', 'An angle is in degrees or rad, so “k” does not fit: write 82° or 1.43 rad.'],
    ['82 ± 1 %', 'The limit of an angle is in degrees, not in percent: write it like ± 1°.'],
    ['north', '“north” is not a number: write one such as 48.2 or 0.24/3.'],
    ['1/0', '“1/0” divides by zero: check the figures.'],
    ['1e400', '“1e400” is too large: check its exponent.'],
    ['48.2 ∠ 82', '“48.2 ∠ 82” is not a number: write one such as 48.2 or 0.24/3.'],
  ])('is refused in one sentence: “%s”', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })
})
