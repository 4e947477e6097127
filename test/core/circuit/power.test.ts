import { expect, test } from 'vitest'
import { chargeOf, dischargeTime, powerOf, totalPower } from '../../../src/core/circuit'

const at = (re: number, im = 0) => ({ re, im })

test('the current of a coil lags, that of a capacitor leads, that of a resistor does neither', () => {
  expect(powerOf(at(10), at(0, -2))).toMatchObject({ active: 0, reactive: 20, sense: 'lags' })
  expect(powerOf(at(10), at(0, 2))).toMatchObject({ reactive: -20, factor: 0, sense: 'leads' })
  expect(powerOf(at(3, 4), at(6, 8))).toMatchObject({ active: 50, factor: 1, sense: 'in phase' })
})

test('power that is given back is negative, and so is its factor', () => {
  expect(powerOf(at(10), at(-2))).toEqual({
    active: -20,
    reactive: 0,
    apparent: 20,
    factor: -1,
    sense: 'in phase',
  })
})

test('where there is none, there is no factor', () => {
  expect(powerOf(at(10), at(0))).toEqual({ active: 0, reactive: 0, apparent: 0 })
  expect(totalPower([])).toEqual({ active: 0, reactive: 0, apparent: 0 })
})

test('active and reactive power add up, and apparent power comes of both', () => {
  const parts = [powerOf(at(10), at(3, -4)), powerOf(at(10), at(1, 1))]
  expect(totalPower(parts)).toMatchObject({ active: 40, reactive: 30, apparent: 50, factor: 0.8 })
})

test('a capacitor keeps the peak, and its energy', () => {
  const { peak, energy } = chargeOf(16e-6, 230)
  expect(peak).toBeCloseTo(325.269, 3)
  expect(energy).toBeCloseTo(16e-6 * 230 ** 2, 12)
})

test('a charge falls by e in each R · C', () => {
  expect(dischargeTime(16e-6, 10_000, 100 * Math.E, 100)).toBeCloseTo(0.16, 12)
  expect(dischargeTime(16e-6, 10_000, 40, 50)).toBe(0)
  expect(dischargeTime(16e-6, 10_000, 40, 0)).toBe(Number.POSITIVE_INFINITY)
})
