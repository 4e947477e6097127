import { describe, expect, test } from 'vitest'
import { type ElementTree, resonanceOf } from '../../../src/core/circuit'

const resistor = (resistance: number): ElementTree => ({
  element: { kind: 'resistor', resistance },
})
const coil = (inductance: number, resistance = 0): ElementTree => ({
  element: { kind: 'coil', resistance, inductance },
})
const capacitor = (capacitance: number, resistance = 0): ElementTree => ({
  element: { kind: 'capacitor', resistance, capacitance },
})

const natural = (inductance: number, capacitance: number) =>
  1 / (2 * Math.PI * Math.sqrt(inductance * capacitance))

describe('a circuit resonates', () => {
  test('R, L and C in series at 1 / 2π√(LC), with the quality 2πfL / R', () => {
    const found = resonanceOf({ series: [resistor(5), coil(0.12), capacitor(100e-6)] })
    const frequency = natural(0.12, 100e-6)
    expect(found?.frequency).toBeCloseTo(frequency, 10)
    expect(found?.quality).toBeCloseTo((2 * Math.PI * frequency * 0.12) / 5, 9)
    expect(found?.bandwidth).toBeCloseTo(5 / (2 * Math.PI * 0.12), 9)
  })

  test('R, L and C in parallel at the same frequency, with the quality 2πfCR', () => {
    const found = resonanceOf({ parallel: [resistor(500), coil(0.12), capacitor(100e-6)] })
    const frequency = natural(0.12, 100e-6)
    expect(found?.frequency).toBeCloseTo(frequency, 10)
    expect(found?.quality).toBeCloseTo(2 * Math.PI * frequency * 100e-6 * 500, 8)
  })

  test('a lossy coil beside a capacitor lower, at √(1/LC − R²/L²) / 2π', () => {
    const found = resonanceOf({ parallel: [coil(0.2, 60), capacitor(20e-6)] })
    const angular = Math.sqrt(1 / (0.2 * 20e-6) - (60 / 0.2) ** 2)
    expect(found?.frequency).toBeCloseTo(angular / (2 * Math.PI), 10)
    expect(found?.quality).toBeCloseTo((angular * 0.2) / 60, 9)
  })

  test('without resistance too, with no quality to speak of', () => {
    for (const tree of [
      { series: [coil(0.1), capacitor(10e-6)] },
      { parallel: [coil(0.1), capacitor(10e-6)] },
    ]) {
      const found = resonanceOf(tree)
      expect(found?.frequency).toBeCloseTo(natural(0.1, 10e-6), 9)
      expect(found).not.toHaveProperty('quality')
    }
  })

  test('of several frequencies, the one nearest to where it works is meant', () => {
    const tank: ElementTree = { parallel: [coil(0.1), capacitor(10e-6)] }
    const tree: ElementTree = { series: [coil(0.05, 1), tank] }
    const high = natural((0.1 * 0.05) / 0.15, 10e-6)
    expect(resonanceOf(tree, 1000)?.frequency).toBeCloseTo(high, 3)
    expect(resonanceOf(tree, 100)?.frequency).toBeCloseTo(natural(0.1, 10e-6), 3)
  })

  test('or not: without coil or capacitor, too lossy, or with a reactance nobody knows the law of', () => {
    expect(resonanceOf({ series: [resistor(5), coil(0.1)] })).toBeUndefined()
    expect(resonanceOf({ parallel: [coil(0.2, 600), capacitor(20e-6)] })).toBeUndefined()
    const motor: ElementTree = { element: { kind: 'impedance', resistance: 5, reactance: 9 } }
    expect(resonanceOf({ series: [motor, coil(0.1), capacitor(10e-6)] })).toBeUndefined()
  })
})
