import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Phasor, quick, readRows, type Sheet, tableOf } from '../../src/sheet'
import { sheetOf } from './sheets'

const empty = sheetOf({})

function onlyPhasor(rows: string[][]): Phasor | undefined {
  const found = readRows(empty, rows)
  expect(found.problems).toEqual([])
  return found.phasors[0]
}

describe('rows of a spreadsheet', () => {
  it('takes label, magnitude and angle in this order where no row names the columns', () => {
    expect(onlyPhasor([['V1', '48,2', '82°']])).toEqual({
      id: 'V1',
      label: 'V1',
      quantity: 'voltage',
      magnitude: { value: 48.2, text: '48,2' },
      angle: { value: 82, text: '82°' },
    })
  })

  it('takes the columns as a first row names them', () => {
    const rows = [
      ['Angle', 'Name', 'Magnitude (V)'],
      ['-30', 'Vcoil', '61.2'],
    ]
    expect(onlyPhasor(rows)).toMatchObject({
      label: 'Vcoil',
      magnitude: { value: 61.2 },
      angle: { value: -30 },
    })
  })

  it('knows the quantity by its name, by its unit, and by the symbol', () => {
    expect(onlyPhasor([['X', '2', '0', 'impedance']])?.quantity).toBe('impedance')
    expect(onlyPhasor([['X', '2 mA', '0']])?.quantity).toBe('current')
    expect(onlyPhasor([['Iload', '2', '0']])?.quantity).toBe('current')
    expect(onlyPhasor([['E', '2', '0']])?.quantity).toBe('voltage')
  })

  it('takes a row marked as read for meter readings, digits kept', () => {
    const found = readRows(empty, [['V1', '23.40', '12.5', '', '0.2', 'read']])
    expect(found.phasors).toEqual([{ id: 'V1', label: 'V1', quantity: 'voltage' }])
    expect(found.readings).toMatchObject([
      { of: 'V1', kind: 'magnitude', shown: '23.40', limit: 0.2 },
      { of: 'V1', kind: 'angle', shown: '12.5' },
    ])
  })

  it('names each row that it cannot read, and reads the others', () => {
    const found = readRows(empty, [
      ['V1', '24', '0'],
      ['V2', 'about nine', '0'],
      ['', '5', '0'],
      ['', '', ''],
      ['V3', '5', 'up'],
      ['V4', '5', '0', 'pressure'],
    ])
    expect(found.phasors.map(({ label }) => label)).toEqual(['V1'])
    expect(found.problems).toHaveLength(4)
    expect(found.problems.map((problem) => problem.split(':')[0])).toEqual([
      'Row 2',
      'Row 3',
      'Row 5',
      'Row 6',
    ])
  })

  it('gives back the values of what was copied', () => {
    const value = fc.double({ min: 1e-3, max: 1e5, noNaN: true })
    const angle = fc.double({ min: -179, max: 180, noNaN: true })
    fc.assert(
      fc.property(fc.array(fc.tuple(value, angle), { maxLength: 8 }), (values) => {
        const sheet: Sheet = {
          ...empty,
          phasors: values.map(([magnitude, degrees], index) => ({
            id: `V${index}`,
            label: `V${index}`,
            quantity: 'voltage',
            magnitude: { value: magnitude },
            angle: { value: degrees },
          })),
        }
        const { phasors, problems } = readRows(empty, tableOf(sheet, quick(sheet)))
        expect(problems).toEqual([])
        expect(
          phasors.map(({ magnitude, angle: turn }) => [magnitude?.value, turn?.value]),
        ).toEqual(values.map(([magnitude, degrees]) => [magnitude, degrees + 0]))
      }),
    )
  })

  it('keeps a label from being taken for a formula, and takes it back as it was', () => {
    const sheet = {
      ...empty,
      phasors: [
        {
          id: 'a',
          label: '=SUM(A1)',
          quantity: 'other' as const,
          magnitude: { value: 1 },
          angle: { value: 0 },
        },
      ],
    }
    const table = tableOf(sheet, quick(sheet))
    expect(table[1]?.[0]).toBe("'=SUM(A1)")
    expect(readRows(empty, table).phasors[0]?.label).toBe('=SUM(A1)')
  })
})
