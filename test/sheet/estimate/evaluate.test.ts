import { describe, expect, test } from 'vitest'
import type { Evaluation, PhasorEvaluation, Reading, Sheet } from '../../../src/sheet'
import { parseSheet } from '../../../src/sheet'
import { evaluate, problemOfSheet } from '../../../src/sheet/estimate'
import { exact, phasor, reads, sheetWith } from './sheets'

function valid(sheet: Sheet): Sheet {
  const parsed = parseSheet(sheet)
  expect(parsed.ok ? [] : parsed.errors).toEqual([])
  return sheet
}

function evaluated(sheet: Sheet): Evaluation {
  return evaluate(valid(sheet), { draws: 200 })
}

function found(evaluation: Evaluation, id: string): PhasorEvaluation {
  const phasorFound = evaluation.phasors.find((each) => each.id === id)
  if (phasorFound === undefined) throw new Error(`no phasor ${id}`)
  return phasorFound
}

const triangle = {
  phasors: [phasor('V'), phasor('V1'), phasor('V2')],
  sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
} as const

describe('the verdict', () => {
  test('is that nothing is left to check where readings just suffice', () => {
    const readings = [reads('V', 100, 1), reads('V1', 60, 1), reads('V2', 70, 1)]
    const evaluation = evaluated(sheetWith({ ...triangle, readings }))
    expect(evaluation.agreement?.verdict).toBe('nothing-to-check')
    expect(evaluation.agreement?.degreesOfFreedom).toBe(0)
    expect(evaluation.agreement?.unchecked).toEqual(readings.map(({ id }) => id))
    expect(evaluation.suspects).toEqual([])
    const { magnitudeState, angleState } = found(evaluation, 'V1')
    expect([magnitudeState, angleState]).toEqual(['given', 'solved'])
    // The terms' angles were solved from the sum: it closes by that, and claims nothing.
    expect(evaluation.sums[0]?.closingError).toBeUndefined()
    expect(evaluation.sums[0]?.closes).toBeUndefined()
    // The triangle and its mirror.
    expect(evaluation.alternatives?.length).toBe(2)
    const [one, other] = evaluation.alternatives ?? []
    expect(one?.phasors[1]?.angle).toBeCloseTo(-(other?.phasors[1]?.angle ?? 0), 9)
  })

  test('is that there are not enough readings where something is open', () => {
    const readings = [reads('V', 40, 1), reads('V1', 24, 1)]
    const evaluation = evaluated(sheetWith({ ...triangle, readings }))
    expect(evaluation.agreement?.verdict).toBe('not-enough')
    const { magnitudeState, angleState, magnitude, angle } = found(evaluation, 'V2')
    expect([magnitudeState, angleState, magnitude, angle]).toEqual([
      'open',
      'open',
      undefined,
      undefined,
    ])
    expect(evaluation.cautions?.map(({ text }) => text)).toEqual([
      'Nothing fixes the angle of V1 or the magnitude and angle of V2: a reading of the magnitude of V2 would.',
    ])
  })

  test('is that readings agree, and how far each was moved', () => {
    const readings: Reading[] = [
      reads('V', 100, 1, 'r1'),
      reads('V1', 60, 1, 'r2'),
      reads('V2', 70, 1, 'r3'),
      { id: 'r4', of: 'V1', kind: 'angle', shown: 43.8, limit: 1 },
    ]
    const evaluation = evaluated(sheetWith({ ...triangle, readings }))
    expect(evaluation.agreement?.verdict).toBe('agree')
    expect(evaluation.agreement?.degreesOfFreedom).toBe(1)
    expect(evaluation.agreement?.unchecked).toEqual([])
    const { magnitudeState, angleState, asRead, angle = 0 } = found(evaluation, 'V1')
    expect([magnitudeState, angleState]).toEqual(['adjusted', 'adjusted'])
    expect(asRead.angle).toBe(43.8)
    expect(angle).toBeGreaterThan(43.53)
    expect(angle).toBeLessThan(43.8)
    // One degree of freedom: every reading is as suspect as the next.
    const scores = (evaluation.suspects ?? []).map(({ score }) => score)
    for (const score of scores) {
      expect(score).toBeCloseTo(Math.sqrt(evaluation.agreement?.chiSquare ?? 0), 4)
    }
    expect(evaluation.alternatives?.length).toBe(1)
  })

  test('is that readings do not agree, with the suspect first', () => {
    const readings: Reading[] = [
      reads('V', 100, 0.5, 'r1'),
      reads('V1', 60, 0.5, 'r2'),
      reads('V2', 70, 0.5, 'r3'),
      { id: 'r4', of: 'V1', kind: 'angle', shown: 43.5, limit: 0.5 },
      { id: 'r5', of: 'V2', kind: 'angle', shown: -30.2, limit: 0.5 },
    ]
    const evaluation = evaluated(sheetWith({ ...triangle, readings }))
    expect(evaluation.agreement?.verdict).toBe('disagree')
    expect(evaluation.agreement?.probability).toBeLessThan(0.001)
    expect(evaluation.suspects?.[0]?.reading).toBe('r5')
  })

  test('of a triangle that cannot be drawn is a sentence, with the nearest drawing', () => {
    const readings = [reads('V', 100, 1), reads('V1', 30, 1), reads('V2', 50, 1)]
    const evaluation = evaluated(sheetWith({ ...triangle, readings }))
    expect(evaluation.agreement?.verdict).toBe('disagree')
    expect(evaluation.cautions?.[0]?.text).toBe(
      'The values of V, V1, V2 contradict each other outright: no diagram can have them all. The nearest one is shown.',
    )
    const values = ['V', 'V1', 'V2'].map((id) => found(evaluation, id).magnitude ?? 0)
    expect(values[0]).toBeCloseTo((values[1] ?? 0) + (values[2] ?? 0), 6)
    expect(found(evaluation, 'V1').angle).toBeCloseTo(0, 4)
  })

  test('of an empty sheet is that nothing is left to check', () => {
    const evaluation = evaluated(sheetWith({ phasors: [] }))
    expect(evaluation.agreement?.verdict).toBe('nothing-to-check')
    expect(evaluation.alternatives).toEqual([{ phasors: [] }])
  })
})

describe('which of several drawings', () => {
  test('is meant, the sheet says: the nearest comes first', () => {
    const readings = [reads('V', 100, 1), reads('V1', 60, 1), reads('V2', 70, 1)]
    const first = evaluated(sheetWith({ ...triangle, readings }))
    expect(found(first, 'V1').angle).toBeCloseTo(43.531, 3)
    const chosen = [{ phasor: 'V1', magnitude: 60, angle: -40 }]
    const other = evaluated(sheetWith({ ...triangle, readings, chosen }))
    expect(found(other, 'V1').angle).toBeCloseTo(-43.531, 3)
    expect(other.alternatives?.[0]?.phasors[1]?.angle).toBeCloseTo(-43.531, 3)
  })

  test('is possible with passive elements comes first', () => {
    const sheet = sheetWith({
      frequency: { value: 50 },
      phasors: [phasor('I', 'current'), phasor('VR'), phasor('VL'), phasor('V')],
      readings: [
        reads('I', 2, 0.02),
        reads('VR', 60, 0.5),
        reads('VL', 80, 0.5),
        reads('V', 110, 1),
      ],
      sums: [{ id: 's', terms: [{ phasor: 'VR' }, { phasor: 'VL' }], equals: 'V' }],
      elements: [
        { id: 'R', kind: 'resistor', voltage: 'VR', current: 'I' },
        { id: 'L', kind: 'coil', voltage: 'VL', current: 'I' },
      ],
    })
    const evaluation = evaluated(sheet)
    expect(found(evaluation, 'VL').angle).toBeGreaterThan(0)
    const coil = evaluation.elements?.find(({ id }) => id === 'L')?.found
    // Three voltmeters: V² = VR² + VL² + 2 VR VL cos φ.
    const cosine = (110 ** 2 - 60 ** 2 - 80 ** 2) / (2 * 60 * 80)
    expect(coil?.resistance?.value).toBeCloseTo(40 * cosine, 9)
    expect(coil?.inductance?.value).toBeCloseTo(
      (40 * Math.sqrt(1 - cosine ** 2)) / (100 * Math.PI),
      9,
    )
    expect(evaluation.agreement?.verdict).toBe('nothing-to-check')
  })
})

describe('a sum', () => {
  const terms = (v1: number, angle1: number): Sheet =>
    sheetWith({
      phasors: [exact('V1', v1, angle1), exact('V2', 40, 90), phasor('V')],
      reference: 'V1',
      readings: [
        reads('V', 50.3, 0.5, 'r1'),
        { id: 'r2', of: 'V', kind: 'angle', shown: 53.5, limit: 1 },
      ],
      sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
    })

  test('closes where the gap is inside its 95 % region, which reaches as far as that ellipse', () => {
    const [sum] = evaluated(terms(30, 0)).sums
    expect(sum?.closes).toBe(true)
    // Two independent errors at right angles: along V and across it.
    const along = 0.5 / Math.sqrt(3)
    const across = (50.3 * Math.PI) / 180 / Math.sqrt(3)
    const { magnitude = 0, angle = 0, allowed = 0 } = sum?.closingError ?? {}
    const turned = ((angle - 53.5) * Math.PI) / 180
    const inverse = (Math.cos(turned) / along) ** 2 + (Math.sin(turned) / across) ** 2
    expect(allowed).toBeCloseTo(Math.sqrt(5.991464547 / inverse), 6)
    expect(magnitude).toBeLessThan(allowed)
  })

  test('does not close where it is outside', () => {
    const evaluation = evaluated(terms(32, 0))
    expect(evaluation.sums[0]?.closes).toBe(false)
    expect(evaluation.agreement?.verdict).toBe('disagree')
  })

  test('of exact values that does not close is allowed nothing', () => {
    const evaluation = evaluated(
      sheetWith({
        phasors: [exact('V1', 30, 0), exact('V2', 40, 90), exact('V', 50.3, 53.5)],
        sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
      }),
    )
    expect(evaluation.sums[0]?.closes).toBe(false)
    expect(evaluation.sums[0]?.closingError?.allowed).toBeLessThan(0.001)
    expect(evaluation.agreement?.verdict).toBe('disagree')
  })
})

describe('limits', () => {
  test('of a value that one limit makes are 1.65 limit / √3', () => {
    const evaluation = evaluated(
      sheetWith({ phasors: [phasor('V')], readings: [reads('V', 230, 2)] }),
    )
    expect(found(evaluation, 'V').magnitudeLimit).toBeCloseTo((1.65 * 2) / Math.sqrt(3), 12)
    expect(found(evaluation, 'V').magnitude).toBe(230)
  })

  test('that nobody stated are assumed: 1 % and 1°', () => {
    const sheet = sheetWith({
      phasors: [
        { id: 'I', label: 'I', quantity: 'current', magnitude: { value: 2 } },
        {
          id: 'V',
          label: 'V',
          quantity: 'voltage',
          magnitude: { value: 230 },
          angle: { value: 30 },
        },
      ],
    })
    const { magnitudeLimit, angleLimit } = found(evaluated(sheet), 'V')
    expect(magnitudeLimit).toBeCloseTo((1.65 * 2.3) / Math.sqrt(3), 12)
    expect(angleLimit).toBeCloseTo(1.65 / Math.sqrt(3), 12)
    const coarse = { ...sheet, assumed: { percent: 2, degrees: 3 } }
    expect(found(evaluated(coarse), 'V').angleLimit).toBeCloseTo((1.65 * 3) / Math.sqrt(3), 12)
  })

  test('by an accuracy statement come from what is "of reading" and from digits, each a cause of its own', () => {
    const sheet = sheetWith({
      phasors: [phasor('V')],
      instruments: [
        { id: 'dmm', name: 'A meter', accuracy: [{ of: 'voltage', text: '±(0.7 % + 3 digits)' }] },
      ],
      readings: [{ id: 'r1', of: 'V', kind: 'magnitude', shown: '230.0', instrument: 'dmm' }],
    })
    const limit = Math.hypot(0.007 * 230, 3 * 0.1)
    expect(found(evaluated(sheet), 'V').magnitudeLimit).toBeCloseTo(
      (1.65 * limit) / Math.sqrt(3),
      12,
    )
  })

  test('of two readings of one meter share what is of the reading', () => {
    const sheet = sheetWith({
      phasors: [phasor('V1'), phasor('V2'), phasor('V')],
      instruments: [
        { id: 'dmm', name: 'A meter', accuracy: [{ of: 'voltage', range: 100, text: '±1 %' }] },
      ],
      readings: [
        { id: 'r1', of: 'V1', kind: 'magnitude', shown: 30, instrument: 'dmm', range: 100 },
        { id: 'r2', of: 'V2', kind: 'magnitude', shown: 40, instrument: 'dmm', range: 100 },
        { id: 'r3', of: 'V2', kind: 'angle', shown: 0, limit: 0 },
      ],
      sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
    })
    // The same 1 % of both: 0.7 of 70, not √(0.3² + 0.4²).
    expect(found(evaluated(sheet), 'V').magnitudeLimit).toBeCloseTo((1.65 * 0.7) / Math.sqrt(3), 9)
  })

  test('of drift are shared by a pass', () => {
    const sheet = (passes: readonly [string, string]): Sheet =>
      sheetWith({
        phasors: [phasor('V1'), phasor('V2'), phasor('V')],
        drift: 1,
        readings: [
          { ...reads('V1', 30, 0, 'r1'), pass: passes[0] },
          { ...reads('V2', 40, 0, 'r2'), pass: passes[1] },
          { id: 'r3', of: 'V2', kind: 'angle', shown: 0, limit: 0 },
        ],
        sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
      })
    const limits = (
      [
        ['a', 'a'],
        ['a', 'b'],
      ] as const
    ).map((passes) => found(evaluated(sheet(passes)), 'V').magnitudeLimit)
    expect(limits[0]).toBeCloseTo((1.65 * 0.7) / Math.sqrt(3), 9)
    expect(limits[1]).toBeCloseTo((2 * Math.hypot(0.3, 0.4)) / Math.sqrt(3), 9)
  })
})

describe('a reading', () => {
  const phasors = [phasor('I', 'current'), phasor('V')]
  const solvedBy = (reading: Reading, more: Partial<Sheet> = {}): PhasorEvaluation =>
    found(
      evaluated(
        sheetWith({
          phasors,
          readings: [reads('I', 2, 0), reads('V', 100, 0.5), reading],
          ...more,
        }),
      ),
      'V',
    )

  test.each<[string, Reading, number]>([
    ['lagging', { id: 'a', of: 'V', kind: 'angle', shown: 20, sense: 'lags' }, -20],
    [
      'a shift on a time base',
      { id: 'a', of: 'V', kind: 'shift', shift: '1.3', period: '8', sense: 'leads' },
      58.5,
    ],
    [
      'an ellipse that leans to the left',
      {
        id: 'a',
        of: 'V',
        kind: 'ellipse',
        intercept: '3',
        height: '6',
        tilt: 'falling',
        sense: 'lags',
      },
      -150,
    ],
    [
      'a power factor with its sense',
      { id: 'a', of: 'V', kind: 'power-factor', with: 'I', shown: '0.5', sense: 'lags' },
      60,
    ],
  ])('of %s fixes the angle', (_, reading, degrees) => {
    expect(solvedBy(reading).angle).toBeCloseTo(degrees, 9)
  })

  test.each<[string, Reading, number]>([
    ['power', { id: 'a', of: 'V', kind: 'power', with: 'I', shown: 100 }, 2],
    ['reactive power', { id: 'a', of: 'V', kind: 'reactive-power', with: 'I', shown: -100 }, 2],
    [
      'a power factor without its sense',
      { id: 'a', of: 'V', kind: 'power-factor', with: 'I', shown: 0.5 },
      2,
    ],
    [
      'an ellipse without tilt',
      { id: 'a', of: 'V', kind: 'ellipse', intercept: 3, height: 6, sense: 'leads' },
      2,
    ],
    ['an ellipse alone', { id: 'a', of: 'V', kind: 'ellipse', intercept: 3, height: 6 }, 4],
    [
      'an ellipse without sense',
      { id: 'a', of: 'V', kind: 'ellipse', intercept: 3, height: 6, tilt: 'rising' },
      2,
    ],
  ])('of %s leaves a choice of drawings', (_, reading, drawings) => {
    const evaluation = evaluated(
      sheetWith({ phasors, readings: [reads('I', 2, 0), reads('V', 100, 0.5), reading] }),
    )
    expect(evaluation.alternatives?.length).toBe(drawings)
  })

  test('through a channel counts with its ratio, turned round where it is reversed', () => {
    const channels = [{ id: 'vt', ratio: { value: 10, limit: 0 }, reversed: true }]
    const evaluation = evaluated(
      sheetWith({
        phasors,
        channels,
        readings: [
          reads('I', 2, 0),
          { id: 'v', of: 'V', kind: 'magnitude', shown: 10, limit: 0.1, channel: 'vt' },
          { id: 'p', of: 'V', kind: 'power', with: 'I', shown: -10, limit: 0.1, channel: 'vt' },
        ],
      }),
    )
    expect(found(evaluation, 'V').magnitude).toBeCloseTo(100, 9)
    // 100 W of 200 VA.
    expect(Math.abs(found(evaluation, 'V').angle ?? 0)).toBeCloseTo(60, 9)
  })

  test('that was struck out is not used', () => {
    const { angleState } = solvedBy({ id: 'a', of: 'V', kind: 'angle', shown: 20, struck: true })
    expect(angleState).toBe('open')
  })

  test('typed and read again is two observations', () => {
    const typed = {
      id: 'V',
      label: 'V',
      quantity: 'voltage',
      magnitude: { value: 101, limit: 1 },
    } as const
    const evaluation = evaluated(
      sheetWith({ phasors: [typed], readings: [reads('V', 100, 1, 'r1')] }),
    )
    expect(found(evaluation, 'V').magnitude).toBeCloseTo(100.5, 9)
    expect(evaluation.agreement?.degreesOfFreedom).toBe(1)
  })
})

describe('repeats', () => {
  test('of one set are correlated as observed: the GUM example of five passes', () => {
    const degrees = (radians: number) => (radians * 180) / Math.PI
    const sheet = sheetWith({
      frequency: { value: 50 },
      reference: 'I',
      phasors: [phasor('I', 'current'), phasor('V')],
      elements: [{ id: 'Z', kind: 'impedance', voltage: 'V', current: 'I' }],
      readings: [
        {
          id: 'v',
          of: 'V',
          kind: 'magnitude',
          shown: 4.999,
          limit: 0,
          pass: 'set',
          repeats: [5.007, 4.994, 5.005, 4.99, 4.999],
        },
        {
          id: 'i',
          of: 'I',
          kind: 'magnitude',
          shown: 0.019661,
          limit: 0,
          pass: 'set',
          repeats: [0.019663, 0.019639, 0.01964, 0.019685, 0.019678],
        },
        {
          id: 'phi',
          of: 'V',
          kind: 'angle',
          shown: degrees(1.04446),
          limit: 0,
          pass: 'set',
          repeats: [1.0456, 1.0438, 1.0468, 1.0428, 1.0433].map(degrees),
        },
      ],
    })
    const [impedance] = evaluated(sheet).elements ?? []
    // Published case G01 (JCGM 100:2008, H.2): R, u(R), X, u(X); t for four degrees of freedom.
    expect(impedance?.found?.resistance?.value).toBeCloseTo(127.732169928, 8)
    expect(impedance?.found?.resistance?.expanded).toBeCloseTo(0.071071407397 * 2.776445105, 8)
    expect(impedance?.found?.reactance?.value).toBeCloseTo(219.846511913, 8)
    expect(impedance?.found?.reactance?.expanded).toBeCloseTo(0.295581677359 * 2.776445105, 8)
  })

  test('alone add s / √n, with the factor of their few degrees of freedom', () => {
    const sheet = sheetWith({
      phasors: [phasor('V')],
      readings: [{ ...reads('V', 10, 0), repeats: [9.9, 10, 10.1] }],
    })
    const { magnitudeLimit } = found(evaluated(sheet), 'V')
    expect(magnitudeLimit).toBeCloseTo((4.30265273 * 0.1) / Math.sqrt(3), 7)
  })
})

describe('what would bend an estimate', () => {
  test('a nameplate does not', () => {
    const element = {
      id: 'R',
      kind: 'resistor',
      voltage: 'V',
      current: 'I',
      marked: { resistance: { value: 10 } },
    } as const
    const sheet = sheetWith({
      phasors: [phasor('I', 'current'), phasor('V')],
      readings: [reads('I', 2, 0.1), reads('V', 100, 0.5)],
      elements: [element],
    })
    const evaluation = evaluated(sheet)
    expect(evaluation.elements?.[0]?.found?.resistance?.value).toBeCloseTo(50, 9)
    expect(found(evaluation, 'V').magnitude).toBe(100)
  })

  test('parts that nothing ties together are solved apart', () => {
    const phasors = Array.from({ length: 60 }, (_, each) => ({
      ...phasor(`V${each}`),
      magnitude: { value: each + 1, limit: 0.1 },
      angle: { value: each, limit: 1 },
    }))
    const evaluation = evaluated(sheetWith({ phasors }))
    expect(evaluation.phasors.map(({ magnitude }) => magnitude)).toEqual(
      phasors.map(({ magnitude }) => magnitude.value),
    )
    expect(problemOfSheet(sheetWith({ phasors })).problem.observations.length).toBe(119)
  })
})
