import { describe, expect, test } from 'vitest'
import { type Complex, magnitudeOf, subtract } from '../../../src/core'
import {
  type Flow,
  flowsIn,
  impedanceOf,
  impedanceOfNetwork,
  inParallel,
  inSeries,
  type Network,
  powerOf,
  totalPower,
} from '../../../src/core/circuit'
import { createRandom } from '../random'
import { type NodalVoltage, nodalVoltages } from './nodal'
import { leavesOf, randomTree } from './random-tree'

const SEED = 20_261_201
const NETWORKS = 1_000

const of = (re: number, im = 0): Network => ({ impedance: { re, im } })
const open: Network = { impedance: 'open' }
const unknown: Network = { impedance: undefined }
const volts = (re: number, im = 0) => ({ path: [], side: 'voltage', value: { re, im } }) as const
const amperes = (re: number, im = 0) => ({ path: [], side: 'current', value: { re, im } }) as const

function flows(network: Network, drive: Parameters<typeof flowsIn>[1]): Flow {
  const answer = flowsIn(network, drive)
  if (!answer.ok) throw new Error(answer.problem)
  return answer.value
}

function problemOf(network: Network, drive: Parameters<typeof flowsIn>[1]): string {
  const answer = flowsIn(network, drive)
  return answer.ok ? '' : answer.problem
}

/** The path of the last impedance. */
function lastLeafOf({ branches }: Flow): readonly number[] {
  const last = branches.at(-1)
  return last === undefined ? [] : [branches.length - 1, ...lastLeafOf(last)]
}

describe(`${NETWORKS} random networks (seed ${SEED})`, () => {
  const random = createRandom(SEED)
  const trees = Array.from({ length: NETWORKS }, () => randomTree(random))

  test('agree with a nodal solution to 1 part in 10⁹, every voltage, by the node potentials', () => {
    let large = 0
    for (const tree of trees) {
      const expected = nodalVoltages(tree)
      const leaves = leavesOf(flows(tree, amperes(1)))
      expect(leaves).toHaveLength(expected.length)
      for (const [at, leaf] of leaves.entries()) {
        const { voltage, potential } = expected[at] as NodalVoltage
        const gap = magnitudeOf(subtract(leaf.voltage as Complex, voltage))
        expect(gap).toBeLessThanOrEqual(1e-9 * potential)
        if (magnitudeOf(voltage) > 1e-3 * potential) large += 1
      }
    }
    // Most of them are no small differences of large potentials, where that would say little.
    expect(large).toBeGreaterThan(5 * NETWORKS)
  })

  test('take up together what is supplied, to 1 part in 10¹² of the apparent power', () => {
    for (const tree of trees) {
      const flow = flows(tree, volts(230))
      const supplied = powerOf(flow.voltage as Complex, flow.current as Complex)
      const total = totalPower(
        leavesOf(flow).map((leaf) => powerOf(leaf.voltage as Complex, leaf.current as Complex)),
      )
      const allowed = 1e-12 * supplied.apparent
      expect(Math.abs(total.active - supplied.active)).toBeLessThanOrEqual(allowed)
      expect(Math.abs(total.reactive - supplied.reactive)).toBeLessThanOrEqual(allowed)
    }
  })

  test('come out the same from whichever of their voltages and currents is known', () => {
    for (const tree of trees.slice(0, 100)) {
      const whole = flows(tree, volts(48))
      const path = lastLeafOf(whole)
      const leaf = path.reduce((node, index) => node.branches[index] as Flow, whole)
      for (const side of ['voltage', 'current'] as const) {
        const again = flows(tree, { path, side, value: leaf[side] as Complex })
        expect(magnitudeOf(again.voltage as Complex)).toBeCloseTo(48, 9)
      }
    }
  })
})

describe('impedances', () => {
  test('with direct current a coil is its resistance, and a capacitor open', () => {
    expect(impedanceOf({ kind: 'coil', resistance: 12, inductance: 0.15 }, 0)).toEqual({
      re: 12,
      im: 0,
    })
    expect(impedanceOf({ kind: 'coil', resistance: 0, inductance: 0.15 }, 0)).toEqual({
      re: 0,
      im: 0,
    })
    expect(impedanceOf({ kind: 'capacitor', resistance: 1, capacitance: 1e-6 }, 0)).toBe('open')
    expect(impedanceOf({ kind: 'capacitor', resistance: 0, capacitance: 0 }, 50)).toBe('open')
  })

  test('that outgrow a double are not known', () => {
    const coil = { kind: 'coil', resistance: 0, inductance: 1e308 } as const
    expect(impedanceOf(coil, 50)).toBeUndefined()
    expect(impedanceOf({ kind: 'resistor', resistance: Number.NaN }, 50)).toBeUndefined()
    const huge = { re: 1e308, im: 0 }
    expect(inSeries([huge, huge])).toBeUndefined()
  })

  test('in series: one open branch opens all; in parallel: one short circuit shorts all', () => {
    expect(inSeries([{ re: 1, im: 0 }, 'open', undefined])).toBe('open')
    expect(inParallel([{ re: 1, im: 0 }, { re: 0, im: 0 }, undefined])).toEqual({ re: 0, im: 0 })
    expect(inParallel(['open', 'open'])).toBe('open')
    expect(inParallel(['open', { re: 3, im: 4 }])).toEqual({ re: 3, im: 4 })
    expect(impedanceOfNetwork({ series: [] })).toBeUndefined()
  })

  test('at resonance without resistance: a short circuit in series, open in parallel', () => {
    const frequency = 1 / (2 * Math.PI * Math.sqrt(0.15 * 16e-6))
    const coil = impedanceOf({ kind: 'coil', resistance: 0, inductance: 0.15 }, frequency)
    const capacitor = impedanceOf(
      { kind: 'capacitor', resistance: 0, capacitance: 16e-6 },
      frequency,
    )
    expect(inSeries([coil, capacitor])).toEqual({ re: 0, im: 0 })
    expect(inParallel([coil, capacitor])).toBe('open')
  })
})

describe('what flows', () => {
  test('nothing is limited in a short circuit, and nothing flows where it is open', () => {
    expect(problemOf(of(0), volts(10))).toContain('short circuit')
    expect(problemOf({ series: [of(0, 5), of(0, -5)] }, volts(10))).toContain('short circuit')
    expect(problemOf(open, amperes(1))).toContain('open')
    expect(problemOf({ parallel: [of(0, 5), of(0, -5)] }, amperes(1))).toContain('open')
  })

  test('a current through a short circuit, and a voltage at an open one, are as they are known', () => {
    expect(flows({ series: [of(0, 5), of(0, -5)] }, amperes(2)).branches[0]?.voltage).toEqual({
      re: 0,
      im: 10,
    })
    const tank = flows({ parallel: [of(0, 5), of(0, -5)] }, volts(10))
    expect(tank.current).toEqual({ re: 0, im: 0 })
    expect(tank.branches[0]?.current).toEqual({ re: 0, im: -2 })
  })

  test('an open branch takes all of the voltage; of two, nobody knows how they share it', () => {
    const one = flows({ series: [of(5), open] }, volts(10))
    expect(one.branches.map(({ voltage }) => voltage?.re)).toEqual([0, 10])
    const two = flows({ series: [of(5), open, open] }, volts(10))
    expect(two.branches.map(({ voltage }) => voltage?.re)).toEqual([0, undefined, undefined])
  })

  test('a short circuit takes all of the current; of two, nobody knows how they share it', () => {
    const one = flows({ parallel: [of(5), of(0)] }, amperes(10))
    expect(one.branches.map(({ current }) => current?.re)).toEqual([0, 10])
    const two = flows({ parallel: [of(5), of(0), of(0)] }, amperes(10))
    expect(two.branches.map(({ current }) => current?.re)).toEqual([0, undefined, undefined])
  })

  test('beside an impedance that is not known, what does not hang on it is known all the same', () => {
    const parallel = flows({ parallel: [of(5), unknown] }, volts(10))
    expect(parallel.branches.map(({ current }) => current?.re)).toEqual([2, undefined])
    const series = flows({ series: [of(5), unknown] }, amperes(2))
    expect(series.branches.map(({ voltage }) => voltage?.re)).toEqual([10, undefined])
    const inside = { path: [0], side: 'current', value: { re: 1, im: 0 } } as const
    expect(problemOf({ series: [of(5), unknown] }, inside)).toContain('not known')
  })

  test('what is always 0 says nothing of the rest', () => {
    const drive = { path: [0], side: 'voltage', value: { re: 5, im: 0 } } as const
    expect(problemOf({ series: [of(0), of(7)] }, drive)).toContain('says nothing')
  })

  test('no part of an answer is ever not a number', () => {
    const sizes = [0, 1e-300, 1, 1e300]
    for (const one of sizes) {
      for (const other of sizes) {
        for (const shape of ['series', 'parallel'] as const) {
          const nodes: Network[] = [of(one, other), of(other, -other), open]
          const network = (
            shape === 'series' ? { series: nodes.slice(0, 2) } : { parallel: nodes }
          ) satisfies Network
          for (const drive of [volts(1e200), amperes(1e200)]) {
            const answer = flowsIn(network, drive)
            expect(JSON.stringify(answer)).not.toMatch(/null/)
          }
        }
      }
    }
  })
})
