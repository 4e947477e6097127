import { describe, expect, it } from 'vitest'
import { nextReading, type Reading } from '../../../src/sheet'
import { polar } from '../sheets'
import { jobOf, phasors } from './jobs'

const volts = (id: string, of: string): Reading => ({
  id,
  of,
  kind: 'magnitude',
  shown: '10.0',
  instrument: 'm1',
  range: 60,
})

describe('the next reading', () => {
  it('begins with the magnitude of the first phasor, and none is asked for where there is none', () => {
    expect(nextReading(jobOf(['I', 'V'], []))).toEqual({ of: 'I', kind: 'magnitude', taken: {} })
    expect(nextReading(jobOf([], []))).toBeUndefined()
  })

  it('is of the next phasor, taken as the last one of its quantity was', () => {
    const sheet = jobOf(['I', 'V1', 'V2'], [volts('r1', 'V1')])
    expect(nextReading(sheet)).toEqual({
      of: 'V2',
      kind: 'magnitude',
      taken: { instrument: 'm1', range: 60 },
    })
    const both = jobOf(['I', 'V1', 'V2'], [volts('r1', 'V1'), volts('r2', 'V2')])
    expect(nextReading(both)).toEqual({ of: 'I', kind: 'magnitude', taken: {} })
  })

  it('goes on to the angles, but for the reference and those that a shift has settled', () => {
    const readings: readonly Reading[] = [
      { id: 'r1', of: 'V1', kind: 'shift', shift: '1', period: '8', sense: 'leads' },
      { id: 'r2', of: 'I', kind: 'magnitude', shown: '1.0' },
      volts('r3', 'V1'),
      volts('r4', 'V2'),
    ]
    expect(nextReading(jobOf(['I', 'V1', 'V2'], readings))).toMatchObject({
      of: 'V2',
      kind: 'angle',
    })
  })

  it('keeps what angles were measured against', () => {
    const angle: Reading = { id: 'r1', of: 'V1', kind: 'angle', shown: '30', against: 'V3' }
    const next = nextReading(jobOf(['I', 'V1', 'V2', 'V3'], [angle]))
    expect(next).toMatchObject({ of: 'V2', kind: 'angle', against: 'V3' })
  })

  it('passes over what was typed', () => {
    const sheet = jobOf([], [volts('r1', 'V1')], {
      phasors: [...phasors('I', 'V1'), polar('V2', '20', '0'), ...phasors('V3')],
    })
    expect(nextReading(sheet)?.of).toBe('V3')
  })
})
