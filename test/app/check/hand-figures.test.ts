import { describe, expect, it } from 'vitest'
import { checkText } from '../../../src/app/check/text'
import { type HandArrow, quick, type Sheet } from '../../../src/sheet'
import { phasor, sheetOf, sum } from '../../drawing/sheets'

const at = (x: number, y: number) => ({ x, y })
const terms: readonly HandArrow[] = [
  { id: 'h1', sum: 's', stands: 'V1', from: at(50, 50), to: at(111, 50) },
  { id: 'h2', sum: 's', stands: 'V2', from: at(111, 50), to: at(111, 130) },
]
const closing: HandArrow = {
  id: 'h3',
  sum: 's',
  stands: 'closing',
  from: at(50, 50),
  to: at(111, 130),
}

/** 30 V and 40 V at right angles, 5 V to 10 mm, against 49 V at 52°: 61, 80 and 100.6 mm were drawn. */
function sheetWith(hand: readonly HandArrow[]): Sheet {
  return sheetOf(
    [phasor('V1', '30.0', '0'), phasor('V2', '40.0', '90'), phasor('VS', '49.0', '52.0')],
    {
      sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })],
      drawing: { unitsPerCentimetre: { voltage: 5 } },
      hand,
    },
  )
}

function figuresOf(sheet: Sheet, isHidden = false) {
  const [first] = sheet.sums ?? []
  if (!first) throw new Error('The sheet has no sum.')
  return checkText(sheet, quick(sheet), first, 5, isHidden).figures
}

describe('the check line of a construction', () => {
  it('sets drawn by hand, calculated and measured side by side, and compares every pair', () => {
    const figures = figuresOf(sheetWith([...terms, closing]))
    expect(figures.map(({ name }) => name)).toEqual([
      'Drawn by hand',
      'Calculated',
      'Measured',
      'Hand less calculated',
      'Hand less measured',
      'Measured less calculated',
    ])
    // √(61² + 80²) = 100.603 mm at atan2(80, 61) = 52.67°; exact are 100 mm at 53.13°.
    expect(figures[0]).toEqual({
      name: 'Drawn by hand',
      figure: '50.30 V ∠ 52.7°',
      under: '100.6 mm on paper',
    })
    expect(figures[3]).toEqual({
      name: 'Hand less calculated',
      figure: '+0.30 V, −0.5°',
      under:
        '+0.6 %, 1.00 mm off, 1.01 mm allowed at this length: within; most of it by V1, 1.00 mm',
    })
    expect(figures[4]).toEqual({
      name: 'Hand less measured',
      figure: '+1.30 V, +0.7°',
      under: '+2.7 %',
    })
  })

  it('counts the arrows until the last is drawn, and hides what is calculated', () => {
    const figures = figuresOf(sheetWith(terms), true)
    expect(figures[0]).toMatchObject({
      name: 'Drawn by hand',
      figure: '–',
      under: expect.stringContaining('2 of 3 arrows'),
    })
    expect(figures[1]).toMatchObject({ name: 'Calculated', figure: '–' })
    expect(JSON.stringify(figures)).not.toContain('50.0 V')
  })

  it('says nothing of a hand where nothing was drawn', () => {
    expect(figuresOf(sheetWith([])).map(({ name }) => name)).not.toContain('Drawn by hand')
  })
})
