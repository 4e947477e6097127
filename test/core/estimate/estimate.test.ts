import { describe, expect, test } from 'vitest'
import { type Drawing, estimatePhasors, type Observable } from '../../../src/core/estimate'
import { expectPublished, nameOf, outputOf, published } from '../../published/cases'
import { angle, at, element, magnitude, problemWith, read, total } from './job'

/** The best value of an observable that must be fixed. */
function best(drawing: Drawing | undefined, of: Observable): number {
  const found = drawing?.find(of)
  expect(found, `${of.kind} is fixed`).toBeDefined()
  return found?.value ?? Number.NaN
}

const size = (phasor: number): Observable => ({ kind: 'magnitude', phasor })
const lead = (phasor: number): Observable => ({ kind: 'angle', phasor })
const ohms = (which: number): Observable => ({ kind: 'resistance', element: which })
const reactance = (which: number): Observable => ({ kind: 'reactance', element: which })

describe('published cases through the estimator', () => {
  test(nameOf(published('U01')), () => {
    const from = published('U01')
    // V, I, V1, V2; Z1 known, Z2 not.
    const problem = problemWith({
      phasors: 4,
      reference: { phasor: 0, angle: 30 },
      sums: [total(0, 2, 3)],
      elements: [element('impedance', 2, 1), element('impedance', 3, 1)],
      observations: [
        magnitude(0, 70),
        magnitude(1, 3.5),
        angle(1, -20),
        read(ohms(0), 4.36),
        read(reactance(0), -2.1),
      ],
    })
    const [drawing, another] = estimatePhasors(problem).drawings
    expect(another).toBeUndefined()
    expectPublished(outputOf(from, 'Re Z2'), best(drawing, ohms(1)))
    expectPublished(outputOf(from, 'Im Z2'), best(drawing, reactance(1)))
  })

  test(nameOf(published('U03')), () => {
    const from = published('U03')
    // V, I, I1, I2, I3.
    const problem = problemWith({
      phasors: 5,
      reference: { phasor: 0, angle: 30 },
      sums: [total(1, 2, 3, 4)],
      elements: [element('impedance', 0, 2), element('impedance', 0, 3), element('resistor', 0, 4)],
      frequency: 5000,
      observations: [
        magnitude(0, 50),
        magnitude(1, 31.4),
        angle(1, 52.48),
        read(ohms(1), 8),
        read(reactance(1), 6),
        read(ohms(2), 10),
      ],
    })
    const [drawing] = estimatePhasors(problem).drawings
    expectPublished(outputOf(from, 'Re Z1'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'Im Z1'), best(drawing, reactance(0)))
    expectPublished(outputOf(from, 'C'), 1e6 * best(drawing, { kind: 'capacitance', element: 0 }))
  })

  test(nameOf(published('U06')), () => {
    const from = published('U06')
    const problem = problemWith({
      phasors: 2,
      elements: [element('impedance', 0, 1)],
      frequency: 50,
      observations: [
        magnitude(0, 120),
        magnitude(1, 8),
        read({ kind: 'power', voltage: 0, current: 1 }, 400),
      ],
    })
    // The three meters fix the size of the reactance only: two drawings, the inductive one first.
    const { drawings } = estimatePhasors(problem)
    expect(drawings.length).toBe(2)
    const [drawing, mirror] = drawings
    expectPublished(outputOf(from, 'R'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'X'), best(drawing, reactance(0)))
    expectPublished(outputOf(from, 'X'), -best(mirror, reactance(0)))
    expectPublished(outputOf(from, '|angle|'), Math.abs(best(drawing, lead(1))))
    const factor = best(drawing, { kind: 'power-factor', voltage: 0, current: 1 })
    expectPublished(outputOf(from, 'pf'), factor)
    expectPublished(outputOf(from, '|Z|'), best(drawing, size(0)) / best(drawing, size(1)))
  })

  test(nameOf(published('U07')), () => {
    const from = published('U07')
    const problem = problemWith({
      phasors: 2,
      elements: [element('impedance', 0, 1)],
      frequency: 60,
      observations: [
        magnitude(0, 100),
        read({ kind: 'power', voltage: 0, current: 1 }, 100),
        read({ kind: 'power-factor', voltage: 0, current: 1, sense: 'leads' }, 0.5),
      ],
    })
    const { drawings } = estimatePhasors(problem)
    expect(drawings.length).toBe(1)
    const [drawing] = drawings
    expectPublished(outputOf(from, 'I'), best(drawing, size(1)))
    expectPublished(outputOf(from, 'R'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'C'), 1e6 * best(drawing, { kind: 'capacitance', element: 0 }))
  })

  test(nameOf(published('U08')), () => {
    const from = published('U08')
    // V, I, IR, IC.
    const problem = problemWith({
      phasors: 4,
      sums: [total(1, 2, 3)],
      elements: [element('resistor', 0, 2), element('capacitor', 0, 3)],
      frequency: 200,
      observations: [
        magnitude(0, 120),
        magnitude(1, 2),
        read({ kind: 'power-factor', voltage: 0, current: 1, sense: 'leads' }, 0.6),
      ],
    })
    const [drawing] = estimatePhasors(problem).drawings
    expectPublished(outputOf(from, 'R'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'C'), 1e6 * best(drawing, { kind: 'capacitance', element: 1 }))
  })

  test(nameOf(published('U10')), () => {
    const from = published('U10')
    const problem = problemWith({
      phasors: 2,
      // v = 141.4 sin(10⁴ t + π/9): 20°.
      reference: { phasor: 0, angle: 20 },
      elements: [element('impedance', 0, 1)],
      frequency: 1e4 / (2 * Math.PI),
      observations: [
        magnitude(0, 141.4 / Math.SQRT2),
        read({ kind: 'power', voltage: 0, current: 1 }, 1732),
        read({ kind: 'power-factor', voltage: 0, current: 1, sense: 'leads' }, 0.866),
      ],
    })
    const [drawing] = estimatePhasors(problem).drawings
    expectPublished(outputOf(from, '|I|'), best(drawing, size(1)))
    expectPublished(outputOf(from, 'I angle'), best(drawing, lead(1)))
    expectPublished(outputOf(from, 'R'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'C'), 1e6 * best(drawing, { kind: 'capacitance', element: 0 }))
  })

  test(nameOf(published('U12')), () => {
    const from = published('U12')
    const problem = problemWith({
      phasors: 3,
      reference: { phasor: 2, angle: 180 },
      sums: [[0, 1, 2].map((phasor) => ({ phasor, sign: 1 }) as const)],
      observations: [magnitude(0, 0.8), magnitude(1, 1.2), magnitude(2, 1)],
    })
    const wanted = [{ phasor: 0, value: at(0.8, 80) }]
    const { drawings } = estimatePhasors(problem, { wanted })
    expect(drawings.length).toBe(2)
    expectPublished(outputOf(from, 'Vab angle'), best(drawings[0], lead(0)))
    expectPublished(outputOf(from, 'Vbc angle'), best(drawings[0], lead(1)))
    expectPublished(outputOf(from, 'Vab angle'), -best(drawings[1], lead(0)))
  })

  test(nameOf(published('T20')), () => {
    const from = published('T20')
    // Source Va, Vb, Vc; load Va, Vb, Vc; Ia, Ib, Ic; the star point.
    const phases = [0, 1, 2] as const
    const values = [
      [0, 5],
      [10, 0],
      [0, -10],
    ] as const
    const problem = problemWith({
      phasors: 10,
      sums: [
        ...phases.map((phase) => total(phase, 3 + phase, 9)),
        [6, 7, 8].map((phasor) => ({ phasor, sign: 1 }) as const),
      ],
      elements: phases.map((phase) => element('impedance', 3 + phase, 6 + phase)),
      observations: [
        ...phases.map((phase) => magnitude(phase, 120, 0)),
        angle(1, -120, 0),
        angle(2, 120, 0),
        ...phases.flatMap((phase) => [
          read(ohms(phase), values[phase][0], 0.05),
          read(reactance(phase), values[phase][1], 0.05),
        ]),
      ],
    })
    const { drawings } = estimatePhasors(problem)
    expect(drawings.length).toBe(1)
    const [drawing] = drawings
    expectPublished(outputOf(from, '|Ia|'), best(drawing, size(6)))
    expectPublished(outputOf(from, '|Ib|'), best(drawing, size(7)))
    expectPublished(outputOf(from, 'Ib angle'), best(drawing, lead(7)))
    expectPublished(outputOf(from, '|Ic|'), best(drawing, size(8)))
    expectPublished(outputOf(from, 'Ic angle'), best(drawing, lead(8)))
    expectPublished(
      outputOf(from, 'QA'),
      best(drawing, { kind: 'reactive-power', voltage: 3, current: 6 }),
    )
  })
})

describe('the GUM example of simultaneous resistance and reactance', () => {
  const volts = [5.007, 4.994, 5.005, 4.99, 4.999]
  const milliamperes = [19.663, 19.639, 19.64, 19.685, 19.678]
  const radians = [1.0456, 1.0438, 1.0468, 1.0428, 1.0433]
  const degrees = 180 / Math.PI

  function mean(values: readonly number[]): number {
    return values.reduce((sum, value) => sum + value, 0) / values.length
  }

  /** The lower triangle whose square is the covariance. */
  function triangleOf(covariance: readonly (readonly number[])[]): number[][] {
    const triangle = covariance.map((row) => row.map(() => 0))
    covariance.forEach((row, i) => {
      for (let j = 0; j <= i; j++) {
        let left = row[j] ?? 0
        for (let k = 0; k < j; k++) left -= (triangle[i]?.[k] ?? 0) * (triangle[j]?.[k] ?? 0)
        const own = triangle[i]
        if (own) own[j] = i === j ? Math.sqrt(left) : left / (triangle[j]?.[j] ?? 1)
      }
    })
    return triangle
  }

  function estimated(covariance: readonly (readonly number[])[], values: readonly number[]) {
    const triangle = triangleOf(covariance)
    const shared = (row: number) =>
      (triangle[row] ?? []).map((sensitivity, error) => ({ error, sensitivity }))
    const problem = problemWith({
      phasors: 2,
      reference: { phasor: 1, angle: 0 },
      elements: [element('impedance', 0, 1)],
      sharedErrors: volts.slice(0, 3).map(() => ({ shape: 'normal', freedom: 4, group: 'passes' })),
      observations: [
        { of: size(0), value: values[0] ?? 0, parts: [], shared: shared(0) },
        { of: size(1), value: values[1] ?? 0, parts: [], shared: shared(1) },
        { of: lead(0), value: values[2] ?? 0, parts: [], shared: shared(2) },
      ],
    })
    const [drawing] = estimatePhasors(problem).drawings
    if (drawing === undefined) throw new Error('no drawing')
    const shares: number[][] = [ohms(0), reactance(0)].map((of) => [
      ...drawing.sharesOf(drawing.candidate.gradientOf(of).gradient),
    ])
    // |Z| is V over I.
    const [v, i] = [size(0), size(1)].map((of) => ({
      value: best(drawing, of),
      shares: drawing.sharesOf(drawing.candidate.gradientOf(of).gradient),
    }))
    if (v === undefined || i === undefined) throw new Error('no quotient')
    const z = v.value / i.value
    shares.push(
      [...v.shares].map((share, k) => z * (share / v.value - (i.shares[k] ?? 0) / i.value)),
    )
    const products = (a = 0, b = 0) =>
      (shares[a] ?? []).reduce((sum, share, k) => sum + share * (shares[b]?.[k] ?? 0), 0)
    const uncertainty = (of: number) => Math.sqrt(products(of, of))
    return {
      drawing,
      z,
      uncertainty,
      correlation: (a: number, b: number) => products(a, b) / uncertainty(a) / uncertainty(b),
    }
  }

  test(nameOf(published('G01')), () => {
    const from = published('G01')
    const sets = [volts, milliamperes.map((value) => value / 1000), radians.map((r) => r * degrees)]
    const means = sets.map(mean)
    const covariance = sets.map((a, i) =>
      sets.map((b, j) => {
        let sum = 0
        a.forEach((value, k) => {
          sum += (value - (means[i] ?? 0)) * ((b[k] ?? 0) - (means[j] ?? 0))
        })
        return sum / 20
      }),
    )
    const { drawing, z, uncertainty, correlation } = estimated(covariance, means)
    expectPublished(outputOf(from, 'R'), best(drawing, ohms(0)))
    expectPublished(outputOf(from, 'X'), best(drawing, reactance(0)))
    expectPublished(outputOf(from, 'Z'), z)
    expectPublished(outputOf(from, 'u(R)'), drawing.find(ohms(0))?.uncertainty ?? 0)
    expectPublished(outputOf(from, 'u(X)'), drawing.find(reactance(0))?.uncertainty ?? 0)
    expectPublished(outputOf(from, 'u(Z)'), uncertainty(2))
    expectPublished(outputOf(from, 'r(R,X)'), correlation(0, 1))
    expectPublished(outputOf(from, 'r(R,Z)'), correlation(0, 2))
    expectPublished(outputOf(from, 'r(X,Z)'), correlation(1, 2))
    // Five passes of one set: four degrees of freedom for every result (the case's note).
    const { uncertainty: u = 1, expanded = 0 } = drawing.find(ohms(0)) ?? {}
    expect(expanded / u).toBeCloseTo(2.776445105, 8)
  })

  test(nameOf(published('G03')), () => {
    const from = published('G03')
    const u = [0.0032, 9.5e-6, 0.75e-3 * degrees]
    const r = [
      [1, -0.36, 0.86],
      [-0.36, 1, -0.65],
      [0.86, -0.65, 1],
    ]
    const covariance = r.map((row, i) => row.map((c, j) => c * (u[i] ?? 0) * (u[j] ?? 0)))
    const { uncertainty, correlation } = estimated(covariance, [4.999, 0.019661, 1.04446 * degrees])
    expectPublished(outputOf(from, 'u(R)'), uncertainty(0))
    expectPublished(outputOf(from, 'u(X)'), uncertainty(1))
    expectPublished(outputOf(from, 'u(Z)'), uncertainty(2))
    expectPublished(outputOf(from, 'r(R,X)'), correlation(0, 1))
    expectPublished(outputOf(from, 'r(R,Z)'), correlation(0, 2))
    expectPublished(outputOf(from, 'r(X,Z)'), correlation(1, 2))
  })

  test(nameOf(published('G02')), () => {
    const from = published('G02')
    const results = volts.map((volt, k) => {
      const problem = problemWith({
        phasors: 2,
        reference: { phasor: 1, angle: 0 },
        elements: [element('impedance', 0, 1)],
        observations: [
          magnitude(0, volt),
          magnitude(1, (milliamperes[k] ?? 0) / 1000),
          angle(0, (radians[k] ?? 0) * degrees),
        ],
      })
      const [drawing] = estimatePhasors(problem).drawings
      return {
        R: best(drawing, ohms(0)),
        X: best(drawing, reactance(0)),
        Z: best(drawing, size(0)) / best(drawing, size(1)),
      }
    })
    for (const name of ['R', 'X', 'Z'] as const) {
      results.forEach((result, k) => {
        expectPublished(outputOf(from, `${name}${k + 1}`), result[name])
      })
      const values = results.map((result) => result[name])
      expectPublished(outputOf(from, `mean ${name}`), mean(values))
      const squares = values.map((value) => (value - mean(values)) ** 2)
      expectPublished(outputOf(from, `s ${name}`), Math.sqrt(mean(squares) / 4))
    }
  })

  test(nameOf(published('G06')), () => {
    const from = published('G06')
    // Ten resistors in series carry 1 A; each was compared with one standard.
    const resistors = Array.from({ length: 10 }, (_, each) => each)
    const uncertainties = [true, false].map((isShared) => {
      const problem = problemWith({
        phasors: 12,
        sums: [total(11, ...resistors.map((each) => each + 1))],
        elements: resistors.map((each) => element('resistor', each + 1, 0)),
        sharedErrors: [{ shape: 'normal' }],
        observations: [
          magnitude(0, 1, 0),
          ...resistors.map((each) => ({
            of: ohms(each),
            value: 1000,
            parts: isShared ? [] : [{ uncertainty: 0.1, shape: 'normal' as const }],
            shared: isShared ? [{ error: 0, sensitivity: 0.1 }] : [],
          })),
        ],
      })
      return estimatePhasors(problem).drawings[0]?.find(size(11))?.uncertainty ?? 0
    })
    expectPublished(outputOf(from, 'uc correlated'), uncertainties[0] ?? 0)
    expectPublished(outputOf(from, 'uc if treated as independent'), uncertainties[1] ?? 0)
  })
})

describe('what readings leave open', () => {
  const loop = [total(0, 1, 2)]

  test('is left out, quantity by quantity', () => {
    const problem = problemWith({
      phasors: 3,
      sums: loop,
      observations: [magnitude(0, 100), magnitude(1, 60)],
    })
    const { drawings, agrees } = estimatePhasors(problem)
    expect(agrees).toBe(true)
    expect(drawings.length).toBe(1)
    expect(drawings[0]?.find(size(1))?.value).toBeCloseTo(60, 9)
    expect(drawings[0]?.find(lead(1))).toBeUndefined()
    expect(drawings[0]?.find(size(2))).toBeUndefined()
    expect(drawings[0]?.degreesOfFreedom).toBe(0)
  })

  test('may be a size where the angle is fixed', () => {
    // A resistor's voltage has its current's angle, whatever its resistance.
    const problem = problemWith({
      phasors: 3,
      elements: [element('resistor', 2, 1)],
      observations: [magnitude(0, 10), magnitude(1, 2), angle(1, 25)],
    })
    const [drawing] = estimatePhasors(problem).drawings
    expect(drawing?.find(lead(2))?.value).toBeCloseTo(25, 9)
    expect(drawing?.find(size(2))).toBeUndefined()
  })

  test('is the angle of what may be nothing', () => {
    const problem = problemWith({
      phasors: 3,
      sums: loop,
      observations: [magnitude(0, 100), magnitude(1, 0, 0.5), magnitude(2, 100)],
    })
    const [drawing] = estimatePhasors(problem).drawings
    expect(drawing?.find(size(2))?.value).toBeCloseTo(100, 9)
    expect(drawing?.find(lead(1))).toBeUndefined()
    expect(drawing?.find(lead(2))?.value).toBeCloseTo(0, 9)
  })
})

describe('readings that contradict each other', () => {
  test('give the nearest drawing, flat, and disagree', () => {
    const problem = problemWith({
      phasors: 3,
      sums: [total(0, 1, 2)],
      observations: [magnitude(0, 100), magnitude(1, 30), magnitude(2, 50)],
    })
    const { drawings, agrees, probability } = estimatePhasors(problem)
    expect(agrees).toBe(false)
    expect(probability).toBeLessThan(1e-9)
    // Each gives way in proportion to its own variance: 20 V over 100² + 30² + 50².
    const share = 20 / (100 ** 2 + 30 ** 2 + 50 ** 2)
    expect(best(drawings[0], size(0))).toBeCloseTo(100 - share * 100 ** 2, 6)
    expect(best(drawings[0], size(1))).toBeCloseTo(30 + share * 30 ** 2, 6)
    expect(best(drawings[0], lead(1))).toBeCloseTo(0, 3)
    expect(best(drawings[0], lead(2))).toBeCloseTo(0, 3)
  })

  test('even though all are exact', () => {
    const problem = problemWith({
      phasors: 3,
      sums: [total(0, 1, 2)],
      observations: [magnitude(0, 100, 0), magnitude(1, 30, 0), magnitude(2, 50, 0)],
    })
    const { drawings, agrees, isSoftened } = estimatePhasors(problem)
    expect([agrees, isSoftened, drawings.length]).toEqual([false, true, 1])
  })
})

describe('a triangle that is nearly flat', () => {
  test('has its limits from draws, the same for the same seed', () => {
    const problem = problemWith({
      phasors: 3,
      sums: [total(0, 1, 2)],
      observations: [magnitude(0, 99.5), magnitude(1, 50), magnitude(2, 50)],
    })
    const [once, twice] = [1, 2].map(() => estimatePhasors(problem, { draws: 200, seed: 7 }))
    const [drawing] = once?.drawings ?? []
    expect(drawing?.isPropagatedByDraws).toBe(true)
    const { value, expanded } = drawing?.find(lead(1)) ?? { value: 0, expanded: 0 }
    expect(Math.abs(value)).toBeCloseTo((180 / Math.PI) * Math.acos(0.995), 6)
    // The cosine is known to 0.012 or so: the angle reaches from nothing to twice itself.
    expect(expanded).toBeGreaterThan(3)
    expect(expanded).toBeLessThan(12)
    expect(twice?.drawings[0]?.find(lead(1))?.expanded).toBe(expanded)
  })
})
