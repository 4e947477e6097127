import { describe, expect, it } from 'vitest'
import { checkText } from '../../../src/app/check/text'
import { quick, type Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { phasor, sheetOf, sum } from '../../drawing/sheets'

function textOf(sheet: Sheet, unitsPerCentimetre: number | undefined = 5) {
  const [first] = sheet.sums ?? []
  if (!first) throw new Error('The sheet has no sum.')
  return checkText(sheet, quick(sheet), first, unitsPerCentimetre)
}

const square = [phasor('V1', '30.0', '0'), phasor('V2', '40.0', '90')]
const withSupply = [...square, phasor('VS', '49.0', '52.0')]

describe('the check line', () => {
  it('sets calculated beside measured, with the differences in unit, per cent, degrees and millimetres', () => {
    const text = textOf(sheetOf(withSupply, { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] }))
    expect(text.scale).toBe('2 phasors · 10 mm = 5 V')
    expect(text.figures).toEqual([
      { name: 'Calculated', figure: '50.0 V ∠ 53.1°', under: '100.0 mm on paper' },
      { name: 'Measured', figure: '49.0 V ∠ 52.0°', under: 'VS, as typed' },
      {
        name: 'Measured less calculated',
        figure: '−1.0 V, −1.1°',
        // The vectors 50∠53.1301° and 49∠52°: √(50² + 49² − 2·50·49·cos 1.1301°) = 1.397.
        under: 'gap 1.4 V, 2.9 %, 2.8 mm on paper',
      },
    ])
  })

  it('says of a sum that must close how far it is from closing', () => {
    const sheet = sheetOf([...square, phasor('V3', '49.0', '-127.0')], {
      sums: [sum('s', ['V1', 'V2', 'V3'], { equals: 0 })],
    })
    const last = textOf(sheet).figures.at(-1)
    expect(last?.name).toBe('Closing error')
    expect(last?.figure).toBe('1.0 V')
  })

  it('claims no check where nothing checks the sum', () => {
    const text = textOf(sheetOf(square, { sums: [sum('s', ['V1', 'V2'])] }))
    expect(text.figures[1]).toMatchObject({
      figure: '–',
      under: expect.stringMatching(/must equal/),
    })
    expect(text.figures[2]).toMatchObject({ figure: '–', under: 'Nothing checks this sum yet.' })
  })

  it('names the terms that are still open', () => {
    const open = { id: 'V3', label: 'Vcoil', quantity: 'voltage' } as const
    const text = textOf(sheetOf([...square, open], { sums: [sum('s', ['V1', 'V3'])] }))
    expect(text.figures).toEqual([
      {
        name: 'Calculated',
        figure: '–',
        under: 'Still open: Vcoil. Type or read magnitude and angle.',
      },
    ])
  })

  it('compares sizes alone where the angle was not measured', () => {
    const supply = { ...phasor('VS', '49.0', '0') }
    const sized = {
      id: 'VS',
      label: 'VS',
      quantity: 'voltage',
      magnitude: supply.magnitude,
    } as const
    const sheet = sheetOf([...square, sized as typeof supply], {
      sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })],
    })
    const [, measured, difference] = textOf(sheet).figures
    expect(measured).toMatchObject({
      figure: '49.0 V',
      under: expect.stringMatching(/no angle yet/),
    })
    expect(difference).toMatchObject({ figure: '−1.0 V', under: '−2.0 %' })
  })

  it('keeps the allowance of the sheet before, marked, until the new one comes', () => {
    const sheet = sheetOf(withSupply, { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] })
    const [first] = sheet.sums ?? []
    if (!first) throw new Error('The sheet has no sum.')
    const whole = evaluate(sheet)
    const sure = checkText(sheet, whole, first, 5).figures
    const former = { evaluation: whole, phasors: new Set<string>() }
    const waiting = checkText(sheet, quick(sheet), first, 5, false, former).figures
    expect(waiting.map(({ name }) => name)).toEqual(sure.map(({ name }) => name))
    expect(waiting.filter(({ isFormer }) => isFormer).map(({ name }) => name)).toEqual([
      'Gap allowed',
    ])
    expect(sure.filter(({ isFormer }) => isFormer)).toEqual([])
    const nothing = { evaluation: undefined, phasors: new Set<string>() }
    const awaited = checkText(sheet, quick(sheet), first, 5, false, nothing).figures
    expect(awaited.at(-1)).toMatchObject({ name: 'Gap allowed', figure: '–', isFormer: true })
    const solved = { evaluation: whole, phasors: new Set(['V2']) }
    const hanging = checkText(sheet, quick(sheet), first, 5, false, solved).figures
    expect(hanging.filter(({ isFormer }) => !isFormer).map(({ name }) => name)).toEqual([
      'Measured',
    ])
  })

  it('leaves the millimetres out where nothing is drawn', () => {
    const sheet = sheetOf(withSupply, { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] })
    const text = checkText(sheet, quick(sheet), sum('s', ['V1', 'V2'], { equals: 'VS' }), undefined)
    expect(JSON.stringify(text)).not.toContain('mm')
  })
})
