import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  apply,
  foundBesideMark,
  partedFrom,
  quick,
  type Sheet,
  type Typed,
} from '../../../src/sheet'
import { evaluate, problemOfSheet } from '../../../src/sheet/estimate'
import { evaluateCircuit } from '../../../src/sheet/estimate/circuit'
import { anyEdit } from '../arbitrary-edit'
import { anySheet } from '../arbitrary-sheet'
import { unhurried } from '../laws'
import { edited, MARKED, measuredJob, seriesJob } from './circuit-jobs'

const LAST_WORD = 'Local rules and licensed practice have the last word.'

function supplied(sheet: Sheet, volts = 48): Sheet {
  return edited(sheet, {
    kind: 'set-value',
    id: 'VS',
    part: 'magnitude',
    value: { form: 'number', number: { value: volts, limit: 0.2 } },
  })
}

function sentences(sheet: Sheet): readonly string[] {
  const { elements = [] } = evaluate(sheet)
  return (sheet.elements ?? []).flatMap((element) => {
    const found = elements.find(({ id }) => id === element.id)
    return found ? foundBesideMark(sheet, element, found).map(({ text }) => text) : []
  })
}

const cautions = (sheet: Sheet) => (evaluate(sheet).cautions ?? []).map(({ text }) => text)
const caution = (sheet: Sheet, words: string) =>
  cautions(sheet).find((text) => text.includes(words)) ?? ''

describe('before a job', () => {
  const evaluation = evaluate(supplied(seriesJob()))

  test('every voltage and current is predicted with its limits', () => {
    expect(evaluation.comparison?.map(({ phasor }) => phasor)).toEqual([
      'VS',
      'I',
      'VR',
      'Vcoil',
      'VC',
    ])
    for (const { predicted } of evaluation.comparison ?? []) {
      expect(predicted.magnitude).toBeGreaterThan(0)
      expect(predicted.magnitudeLimit).toBeGreaterThan(0)
      expect(predicted.angleLimit).toBeGreaterThanOrEqual(0)
    }
  })

  test('so is every impedance, and that of the whole', () => {
    for (const { predicted } of evaluation.elements ?? []) {
      expect(predicted?.magnitudeLimit).toBeGreaterThan(0)
    }
    const current = evaluation.comparison?.find(({ phasor }) => phasor === 'I')?.predicted
    expect(evaluation.impedance?.magnitude).toBeCloseTo(48 / (current?.magnitude ?? 0), 9)
    const resistor = evaluation.elements?.find(({ id }) => id === 'R')?.predicted
    expect(resistor).toMatchObject({ real: 100, imaginary: 0, angle: 0 })
  })

  test('nothing is compared, since nothing was measured', () => {
    for (const each of evaluation.comparison ?? []) expect(each).not.toHaveProperty('agrees')
  })

  test('power is that of the prediction, and says so; it adds up', () => {
    const power = evaluation.power ?? []
    expect(power.map(({ of, predicted }) => [of, predicted])).toEqual([
      ['R', true],
      ['coil', true],
      ['C', true],
      ['total', true],
    ])
    const sum = (part: 'active' | 'reactive') =>
      power.slice(0, -1).reduce((total, each) => total + each[part], 0)
    const total = power.at(-1)
    expect(total?.active).toBeCloseTo(sum('active'), 12)
    expect(total?.reactive).toBeCloseTo(sum('reactive'), 12)
    const current = evaluation.comparison?.find(({ phasor }) => phasor === 'I')?.predicted
    expect(total?.apparent).toBeCloseTo(48 * (current?.magnitude ?? 0), 9)
  })

  test('resonance is that of the marks', () => {
    const { inductance, capacitance, resistance, winding } = MARKED
    const frequency = 1 / (2 * Math.PI * Math.sqrt(inductance * capacitance))
    expect(evaluation.resonance?.frequency).toBeCloseTo(frequency, 9)
    expect(evaluation.resonance?.bandwidth).toBeCloseTo(
      (resistance + winding) / (2 * Math.PI * inductance),
      9,
    )
  })

  test('what is missing is said', () => {
    expect(caution(seriesJob(), 'predicted')).toBe(
      'Nothing is predicted yet. Type or read VS to predict from it, or name another supply.',
    )
    const bare = edited(supplied(seriesJob()), {
      kind: 'add-element',
      element: { kind: 'impedance', label: 'motor' },
      at: [],
      form: 'parallel',
    })
    expect(caution(bare, 'to predict from')).toBe(
      'motor has no value to predict from: what hangs on it is not predicted.',
    )
    expect(evaluate(bare).comparison?.map(({ phasor }) => phasor)).toEqual([
      'VS',
      'I',
      'VR',
      'Vcoil',
      'VC',
    ])
    const timeless = edited(supplied(seriesJob()), { kind: 'set-details', frequency: null })
    expect(caution(timeless, 'frequency')).toContain('type the frequency')
  })

  test('any one current or voltage may drive the prediction', () => {
    const current = evaluation.comparison?.find(({ phasor }) => phasor === 'I')?.predicted
    const driven = edited(
      seriesJob(),
      { kind: 'set-details', supply: 'I' },
      {
        kind: 'set-value',
        id: 'I',
        part: 'magnitude',
        value: { form: 'number', number: { value: current?.magnitude ?? 0, limit: 0 } },
      },
    )
    const source = evaluate(driven).comparison?.find(({ phasor }) => phasor === 'VS')
    expect(source?.predicted.magnitude).toBeCloseTo(48, 9)
  })
})

describe('a job in order', () => {
  const sheet = measuredJob(MARKED)
  const evaluation = evaluate(sheet)

  test('measures what was predicted, but for what drives the prediction, which could not differ', () => {
    const [source, current, ...others] = evaluation.comparison ?? []
    expect(source?.difference).not.toHaveProperty('magnitude')
    expect(source).toMatchObject({ phasor: 'VS', agrees: true })
    expect(current?.difference).not.toHaveProperty('angle')
    for (const each of [current, ...others]) {
      expect(each?.agrees).toBe(true)
      expect(Math.abs(each?.difference?.magnitude ?? 9)).toBeLessThan(each?.allowed ?? 0)
    }
  })

  test('agrees with itself where all is exact', () => {
    const exact = supplied(seriesJob())
    const certain = (typed: Typed) => ({ ...typed, limit: 0 })
    const sure = {
      ...exact,
      phasors: exact.phasors.map((each) =>
        each.magnitude ? { ...each, magnitude: certain(each.magnitude) } : each,
      ),
      elements: (exact.elements ?? []).map((each) => ({
        ...each,
        marked: Object.fromEntries(
          Object.entries(each.marked ?? {}).map(([value, typed]) => [value, certain(typed)]),
        ),
      })),
    }
    const expected = new Map(
      evaluate(sure).comparison?.map(({ phasor, predicted }) => [phasor, predicted]),
    )
    const typed = {
      ...sure,
      phasors: sure.phasors.map((each) => ({
        ...each,
        magnitude: { value: expected.get(each.id)?.magnitude ?? 0, limit: 0 },
      })),
    }
    const verdicts = evaluate(typed).comparison?.map(({ agrees }) => agrees)
    expect(verdicts).toEqual([undefined, true, true, true, true])
  })

  test('allows both limits together', () => {
    for (const { predicted, measured, allowed, allowedAngle } of evaluation.comparison ?? []) {
      if (allowed !== undefined) {
        const both = [predicted.magnitudeLimit ?? 0, measured?.magnitudeLimit ?? 0]
        expect(allowed).toBeCloseTo(Math.hypot(...both), 12)
      }
      if (allowedAngle !== undefined) {
        const both = [predicted.angleLimit ?? 0, measured?.angleLimit ?? 0]
        expect(allowedAngle).toBeCloseTo(Math.hypot(...both), 12)
      }
    }
  })

  test('finds each element within the tolerance of its mark', () => {
    expect(sentences(sheet)).toHaveLength(4)
    for (const text of sentences(sheet)) expect(text).toMatch(/within tolerance\.$/)
  })

  test('has the power of what was measured', () => {
    expect(evaluation.power?.every(({ predicted }) => predicted === undefined)).toBe(true)
    const total = evaluation.power?.at(-1)
    const best = (id: string) => evaluation.phasors.find((each) => each.id === id)?.magnitude ?? 0
    expect(total?.apparent).toBeCloseTo(best('VS') * best('I'), 9)
  })
})

describe('a bad capacitor', () => {
  const sheet = measuredJob({ ...MARKED, capacitance: 13.1e-6 })

  test('is found as such', () => {
    const found = sentences(sheet).find((text) => text.startsWith('run capacitor'))
    expect(found).toMatch(
      /^run capacitor: 13\.\d+ µF ± 0\.\d+ µF found, 16 µF ± 5 % marked: below tolerance\.$/,
    )
    const others = sentences(sheet).filter((text) => !text.startsWith('run capacitor'))
    for (const text of others) expect(text).toContain('within tolerance')
  })

  test('makes the readings differ from what was predicted, and the readings still agree', () => {
    const { comparison = [], agreement } = evaluate(sheet)
    const verdicts = new Map(comparison.map(({ phasor, agrees }) => [phasor, agrees]))
    expect(verdicts.get('VC')).toBe(false)
    expect(agreement?.verdict).toBe('agree')
  })

  test('contradicts the readings where its value counts in the check', () => {
    const counted = edited(sheet, { kind: 'count-element', id: 'C', counts: true })
    expect(evaluate(counted).agreement?.verdict).toBe('disagree')
  })
})

describe('a value off by a prefix', () => {
  const sheet = measuredJob(MARKED, { ...MARKED, inductance: 150 })

  test('is accepted, and the answer says how far the readings are from it', () => {
    const inductance = sentences(sheet).find((text) => text.startsWith('coil, inductance'))
    expect(inductance).toMatch(
      /^coil, inductance: 1[45]\d(\.\d)? mH ± .* found, 150 H ± 5 % marked: below tolerance, by a factor of about 1000: look at the prefix of the mark\.$/,
    )
    const current = evaluate(sheet).comparison?.find(({ phasor }) => phasor === 'I')
    expect(current?.agrees).toBe(false)
    expect(current?.difference?.percent).toBeGreaterThan(10_000)
  })
})

test('any valid sheet has an answer, and no figure in it is not a number', unhurried, () => {
  fc.assert(
    fc.property(anySheet, fc.array(anyEdit, { maxLength: 6 }), (sheet, edits) => {
      const changed = edits.reduce((before, editOf) => {
        const edit = editOf(before)
        const after = edit && apply(before, edit)
        return after?.ok ? after.value : before
      }, sheet)
      const { phasors } = quick(changed)
      const { parts } = evaluateCircuit(changed, phasors, [], problemOfSheet(changed))
      expect(JSON.stringify(parts)).not.toMatch(/null/)
      for (const sentence of partedFrom(changed)) expect(sentence).toMatch(/\.$/)
    }),
    { seed: 8, numRuns: 200 },
  )
})

describe('cautions', () => {
  test('each ends with those who have the last word', () => {
    const sheet = supplied(seriesJob({ ...MARKED, inductance: 0.6, resistance: 5 }), 230)
    const risky = edited(
      sheet,
      { kind: 'set-details', safety: { voltageLimit: 25, dischargeResistance: 10e3 } },
      { kind: 'set-element', id: 'coil', change: { rating: { current: 0.5, voltage: 100 } } },
    )
    const texts = cautions(risky).filter((text) => !text.startsWith('Nothing fixes'))
    expect(texts.length).toBeGreaterThan(6)
    for (const text of texts) {
      expect(text.endsWith(LAST_WORD)).toBe(true)
      expect(text).toMatch(/\d/)
    }
    expect(caution(risky, 'above its rating of 500 mA')).toContain('The current of coil')
    expect(caution(risky, 'above its rating of 100 V')).toContain('The voltage of coil')
  })

  test('of touch voltage: above 50 V, or the lower value for the place, never a higher one', () => {
    const low = supplied(seriesJob(), 24)
    expect(caution(low, 'up to which touch')).toBe('')
    const wet = edited(low, { kind: 'set-details', safety: { voltageLimit: 12 } })
    expect(caution(wet, 'that this sheet sets')).toMatch(
      /^VC at \d\d\.\d+ V \(predicted\), VS at 24/,
    )
    const high = edited(supplied(seriesJob(), 230), {
      kind: 'set-details',
      safety: { voltageLimit: 400 },
    })
    expect(caution(high, 'up to which touch')).toContain('above the 50 V ac')
  })

  test('of an element’s voltage above that of the supply', () => {
    const sheet = supplied(seriesJob({ ...MARKED, resistance: 5 }), 24)
    expect(caution(sheet, 'above that of the supply')).toMatch(
      /^The voltage of run capacitor, \d+\.\d+ V \(predicted\), is above that of the supply, 24\.0/,
    )
    expect(cautions(supplied(seriesJob({ ...MARKED, resistance: 900 }), 24)).join()).not.toContain(
      'above that of the supply',
    )
  })

  test('of a charged capacitor: peak, energy and the time through a given resistor', () => {
    const sheet = edited(supplied(seriesJob(), 230), {
      kind: 'set-details',
      safety: { dischargeResistance: 10e3 },
    })
    const { comparison } = evaluate(sheet)
    const volts = comparison?.find(({ phasor }) => phasor === 'VC')?.predicted.magnitude ?? 0
    const text = caution(sheet, 'stay charged')
    const peak = Math.SQRT2 * volts
    expect(text).toContain(`a peak of ${peak.toPrecision(3)} V`)
    expect(text).toContain(`${(8e-6 * peak ** 2).toPrecision(2)} J`)
    const seconds = 0.16 * Math.log(peak / 50)
    expect(text).toContain(
      `Through 10 kΩ it falls to 50 V in ${seconds.toPrecision(2)} s: measure that it has.`,
    )
  })

  test('of resonance near the working frequency, by its marks', () => {
    const near = supplied(seriesJob({ ...MARKED, inductance: 0.6, resistance: 5 }))
    expect(caution(near, 'resonates')).toMatch(
      /^By its values the circuit resonates at 51\.37 Hz, near the working frequency of 50 Hz: .* 11\.4 times/,
    )
    expect(caution(supplied(seriesJob()), 'resonates')).toBe('')
  })

  test('of power that is given back', () => {
    const sheet = measuredJob(MARKED)
    const reversed = {
      ...sheet,
      readings: (sheet.readings ?? []).map((each) =>
        each.kind === 'angle' ? { ...each, shown: String(180 - Number(each.shown)) } : each,
      ),
    }
    expect(caution(reversed, 'an export')).toContain('gives back')
    expect(caution(sheet, 'an export')).toBe('')
  })

  test('of a dc resistance that stands in for the ac resistance, and of an impedance', () => {
    const direct = edited(
      supplied(seriesJob()),
      { kind: 'set-element-value', id: 'coil', value: 'resistance', typed: null },
      {
        kind: 'set-element-value',
        id: 'coil',
        value: 'dcResistance',
        typed: { value: 11.2, text: '11.2' },
      },
    )
    expect(caution(direct, 'direct current')).toContain('the ac resistance of coil')
    const motor = edited(supplied(seriesJob()), {
      kind: 'add-element',
      element: {
        kind: 'impedance',
        label: 'motor',
        marked: { resistance: { value: 30 }, reactance: { value: 20 } },
      },
      at: [],
      form: 'parallel',
    })
    expect(caution(motor, 'running motor')).toContain('motor is predicted')
  })
})
