import { describe, expect, test } from 'vitest'
import { angleOf, magnitudeOf } from '../../../src/core'
import {
  createRandom,
  estimatePhasors,
  type Missing,
  missingReadings,
  type Observation,
  type PhasorProblem,
} from '../../../src/core/estimate'
import { angle, at, element, magnitude, problemWith, total } from './job'
import { loopKinds } from './loops'

const seed = Number(process.env.SEED ?? 41_206)
const LOOPS = 8
/** Of how many loops of a kind the estimator itself is asked: it takes longest. */
const ESTIMATED = 2
const all = ({ phasors }: PhasorProblem) => Array.from({ length: phasors }, (_, each) => each)

function named({ kind, phasor }: Missing): string {
  return `${kind} ${phasor}`
}

describe('what is missing', () => {
  const triangle = { phasors: 3, sums: [total(0, 1, 2)] }

  test('in a triangle of which two sides were read is the third: it fixes every angle', () => {
    const observations = [magnitude(0, 100), magnitude(1, 60)]
    const { open, plan } = missingReadings(problemWith({ ...triangle, observations }), [0, 1, 2])
    expect(open.map(named)).toEqual(['angle 1', 'magnitude 2', 'angle 2'])
    expect(plan.map(({ reading }) => named(reading))).toEqual(['magnitude 2'])
    expect(plan[0]?.fixes).toEqual(open)
  })

  test('is nothing where all is fixed', () => {
    const observations = [magnitude(0, 100), magnitude(1, 60), magnitude(2, 70)]
    const found = missingReadings(problemWith({ ...triangle, observations }), [0, 1, 2])
    expect(found).toEqual({ open: [], plan: [] })
  })

  test('is a reading for each direction in which nothing is known', () => {
    const problem = problemWith({ ...triangle, observations: [] })
    const { open, plan } = missingReadings(problem, [0, 1, 2])
    expect(open.length).toBe(5)
    expect(plan.map(({ reading }) => named(reading))).toEqual([
      'magnitude 0',
      'magnitude 1',
      'magnitude 2',
    ])
  })

  test('is the current where an element ties it to a voltage that is known', () => {
    const problem = problemWith({
      phasors: 2,
      elements: [element('resistor', 0, 1)],
      observations: [magnitude(0, 100)],
    })
    const { open, plan } = missingReadings(problem, [0, 1])
    // A resistor's current is in line with its voltage: its angle is fixed, its size is not.
    expect(open.map(named)).toEqual(['magnitude 1'])
    expect(plan.map(({ reading }) => named(reading))).toEqual(['magnitude 1'])
  })

  test('is not said where exact values contradict each other', () => {
    const observations = [at(1, 0), at(2, 0), at(9, 0)].flatMap((value, phasor) => [
      magnitude(phasor, magnitudeOf(value), 0),
    ])
    expect(missingReadings(problemWith({ ...triangle, observations }), [0, 1, 2]).open).toEqual([])
  })
})

/** The same loop with some of its readings left away at random. */
function thinned(problem: PhasorProblem, random: () => number): PhasorProblem {
  return { ...problem, observations: problem.observations.filter(() => random() > 0.4) }
}

function readingOf({ kind, phasor }: Missing, truth: readonly { re: number; im: number }[]) {
  const value = truth[phasor] ?? { re: 0, im: 0 }
  return kind === 'magnitude'
    ? magnitude(phasor, magnitudeOf(value))
    : angle(phasor, angleOf(value))
}

describe(`readings that are named as missing, seed ${seed}`, () => {
  test.each(Object.entries(loopKinds))(
    '%s: fix what was open once they are taken',
    (name, make) => {
      const random = createRandom(seed)
      let judged = 0
      for (let each = 0; each < LOOPS; each++) {
        const { problem, truth, isTangent } = make(random)
        const poor = thinned(problem, random)
        if (isTangent) continue
        const { open, plan } = missingReadings(poor, all(poor))
        const added: Observation[] = []
        for (const { reading, fixes } of plan) {
          added.push(readingOf(reading, truth))
          const known = { ...poor, observations: [...poor.observations, ...added] }
          const still = missingReadings(known, all(poor)).open.map(named)
          const which = `${name}, loop ${each}: ${named(reading)}`
          for (const quantity of fixes) expect(still, which).not.toContain(named(quantity))
        }
        if (open.length === 0) continue
        judged++
        if (judged > ESTIMATED) continue
        // And so the estimator itself finds it.
        const { drawings } = estimatePhasors(
          { ...poor, observations: [...poor.observations, ...added] },
          { draws: 0 },
        )
        for (const quantity of open) {
          expect(drawings[0]?.candidate.isFixed(quantity), `${name}, loop ${each}`).toBe(true)
        }
      }
      expect(judged).toBeGreaterThan(2)
    },
  )
})
