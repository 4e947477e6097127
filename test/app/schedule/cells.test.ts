import { describe, expect, it } from 'vitest'
import { rowText } from '../../../src/app/schedule/cells'
import { readingsByPhasor } from '../../../src/drawing'
import { quick, type Reading, type Sheet } from '../../../src/sheet'
import { jobOf } from '../../sheet/readings/jobs'

function row(sheet: Sheet, id: string) {
  const index = sheet.phasors.findIndex((phasor) => phasor.id === id)
  const [phasor, found] = [sheet.phasors[index], quick(sheet).phasors[index]]
  if (phasor === undefined || found === undefined) throw new Error(`there is no phasor ${id}`)
  return rowText(sheet, phasor, found, readingsByPhasor(sheet))
}

const clamp: Reading = {
  id: 'r1',
  of: 'I',
  kind: 'magnitude',
  shown: '1.26',
  turns: 4,
  limit: 0.02,
}

describe('the limit in the schedule', () => {
  it('of a reading is in the unit of its phasor, whatever the display counted', () => {
    const { limit } = row(jobOf(['V', 'I'], [clamp]), 'I')
    expect(limit).toEqual({ shown: '0.005 A', typed: '0.005 A', derived: false })
  })

  it('that comes from an instrument is shown as worked out, and is not typed', () => {
    const volts: Reading = {
      id: 'r2',
      of: 'V',
      kind: 'magnitude',
      shown: '48.20',
      instrument: 'm1',
    }
    const { limit } = row(jobOf(['I', 'V'], [volts]), 'V')
    expect(limit).toEqual({ shown: '0.37 V', typed: '', derived: true })
  })

  it('that nobody stated is assumed, by what the sheet assumes', () => {
    const volts: Reading = { id: 'r2', of: 'V', kind: 'magnitude', shown: '50.0' }
    const sheet = jobOf(['I', 'V'], [volts], { assumed: { percent: 2 } })
    expect(row(sheet, 'V').limit).toEqual({ shown: '1 V assumed', typed: '', derived: true })
  })
})

describe('an angle that was read as a shift', () => {
  it('is known as read, and shown as worked out', () => {
    const shift: Reading = {
      id: 'r1',
      of: 'V',
      kind: 'shift',
      shift: '1.3',
      period: '8',
      sense: 'lags',
    }
    const { angle, known } = row(jobOf(['I', 'V'], [shift]), 'V')
    expect(known).toBe('read')
    expect(angle).toEqual({ shown: '−58.5°', typed: '−58.5°', derived: true })
  })
})
