import { describe, expect, it } from 'vitest'
import {
  comparisonRows,
  impedanceRows,
  powerRows,
  resonanceText,
} from '../../../src/drawing/circuit'
import { type ComparisonEvaluation, type Evaluation, quick } from '../../../src/sheet'
import { ballasted } from '../schematic/circuits'
import { phasor } from '../sheets'

const sheet = {
  ...ballasted,
  phasors: ballasted.phasors.map((each) =>
    each.id === 'VR' ? { ...phasor('VR', '96.1', '0.5'), label: 'VR' } : each,
  ),
}

function evaluated(rest: Partial<Evaluation>): Evaluation {
  return { ...quick(sheet), ...rest }
}

const compared: ComparisonEvaluation = {
  phasor: 'VR',
  predicted: { magnitude: 94.04, angle: -0.8, magnitudeLimit: 4.74, angleLimit: 1.2 },
  measured: { magnitude: 96.1, angle: 0.5, magnitudeLimit: 0.96, angleLimit: 1 },
  difference: { magnitude: 2.06, percent: 2.19, angle: 1.3 },
  allowed: 4.84,
  allowedAngle: 1.57,
  agrees: true,
}

describe('the comparison in words', () => {
  it('sets predicted, measured, difference and allowed beside each other, part by part', () => {
    expect(comparisonRows(sheet, evaluated({ comparison: [compared] }))).toEqual([
      {
        phasor: 'VR',
        label: 'VR',
        agrees: true,
        verdict: 'agrees',
        parts: [
          {
            part: 'magnitude',
            predicted: '94.0 V ± 4.8 V',
            measured: '96.1 V',
            difference: '+2.1 V',
            percent: '+2.2 %',
            allowed: '± 4.8 V',
          },
          {
            part: 'angle',
            predicted: '−0.8° ± 1.2°',
            measured: '0.5°',
            difference: '+1.3°',
            percent: '',
            allowed: '± 1.6°',
          },
        ],
      },
    ])
  })

  it('gives every quantity a verdict, or says why it has none', () => {
    const { measured: _m, difference: _d, agrees: _a, ...unread } = compared
    const { difference: _e, agrees: _b, ...driving } = compared
    const rows = [{ ...compared, agrees: false }, unread, driving].map(
      (each) => comparisonRows(sheet, evaluated({ comparison: [each] }))[0],
    )
    expect(rows.map((row) => row?.verdict)).toEqual(['differs', 'not measured', 'drives it'])
    expect(rows.map((row) => row?.agrees)).toEqual([false, undefined, undefined])
  })

  it('shows a value that is off by a prefix in the unit of the prediction', () => {
    const off = {
      ...compared,
      predicted: { magnitude: 0.094, magnitudeLimit: 0.005 },
      difference: { magnitude: 96.006, percent: 102134 },
      allowed: 0.96,
      agrees: false,
    }
    const [row] = comparisonRows(sheet, evaluated({ comparison: [off] }))
    expect(row?.parts[0]?.predicted).toBe('94.0 mV ± 5.0 mV')
    expect(row?.parts[0]?.percent).toBe('+100000 %')
    expect(row?.verdict).toBe('differs')
  })

  it('has no rows where nothing is predicted', () => {
    expect(comparisonRows(sheet, quick(sheet))).toEqual([])
  })
})

describe('impedances in words', () => {
  it('stand predicted beside found, of each element and of the whole', () => {
    const elements = [
      {
        id: 'L1',
        impedance: { magnitude: 47.75, angle: 80.25, real: 8.09, imaginary: 47.06 },
        predicted: { magnitude: 47.832, angle: 80.13, magnitudeLimit: 2.21, angleLimit: 0.79 },
      },
      { id: 'C1' },
    ]
    const impedance = { magnitude: 203.5, angle: -74.3 }
    expect(impedanceRows(sheet, evaluated({ elements, impedance }))).toEqual([
      {
        of: 'L1',
        name: 'Main winding',
        predicted: ['47.8 Ω ± 2.3 Ω', '80.13° ± 0.79°'],
        found: ['47.75 Ω', '80.3°'],
      },
      { of: 'total', name: 'Total', predicted: ['203.5 Ω', '−74.3°'], found: [] },
    ])
  })
})

describe('powers in words', () => {
  it('tell lead from lag, export from import, and the total from its parts', () => {
    const rows = powerRows(
      sheet,
      evaluated({
        power: [
          { of: 'R1', active: 188, reactive: 1e-12, apparent: 188, factor: 1, sense: 'in phase' },
          { of: 'C1', active: 0, reactive: -140, apparent: 140, factor: 0, sense: 'leads' },
          {
            of: 'total',
            active: -60,
            reactive: 80,
            apparent: 100,
            factor: -0.6,
            sense: 'lags',
            predicted: true,
          },
        ],
      }),
    )
    expect(
      rows.map(({ name, active, reactive, factor }) => [name, active, reactive, factor]),
    ).toEqual([
      ['Ballast', '188.0 W', '0 var', '1.000, in phase'],
      ['Run capacitor', '0 W', '−140.0 var', '0.000, leads'],
      ['Total', '−60.00 W', '80.00 var', '−0.600, lags, given back'],
    ])
    expect(rows.map(({ isPredicted }) => isPredicted)).toEqual([false, false, true])
  })
})

describe('resonance in words', () => {
  it('says the frequency, and quality and bandwidth where something takes up power', () => {
    const resonance = { frequency: 102.7, quality: 11.34, bandwidth: 9.056 }
    expect(resonanceText(evaluated({ resonance }))).toBe(
      'Resonance at 103 Hz, quality factor 11.3, bandwidth 9.06 Hz.',
    )
    expect(resonanceText(evaluated({ resonance: { frequency: 50 } }))).toBe('Resonance at 50.0 Hz.')
    expect(resonanceText(quick(sheet))).toBeUndefined()
  })
})
