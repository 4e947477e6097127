import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { largestContribution, type Place, quick, type Sheet } from '../../../src/sheet'
import { polar, sheetOf } from '../sheets'
import { anyBuilt, saidOf, sheetOfBuilt } from './constructions'

/** 30 V along the reference and 40 V upright, 5 V to 10 mm: a triangle of 60, 80 and 100 mm. */
function triangle(hand: Sheet['hand'], rest: Partial<Sheet> = {}): Sheet {
  return sheetOf({
    phasors: [polar('V1', '30', '0'), polar('V2', '40', '90')],
    sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }] }],
    drawing: { unitsPerCentimetre: { voltage: 5 } },
    ...(hand ? { hand } : {}),
    ...rest,
  })
}

const at = (x: number, y: number): Place => ({ x, y })
const first = { id: 'h1', sum: 's1', stands: 'V1', from: at(50, 50), to: at(111, 50) }
const second = { id: 'h2', sum: 's1', stands: 'V2', from: at(111, 50), to: at(111, 130) }
const closing = {
  id: 'h3',
  sum: 's1',
  stands: 'closing' as const,
  from: at(50, 50),
  to: at(111, 130),
}

describe('a hand arrow', () => {
  it('is read off through the scale and compared with what it stands for', () => {
    // 61 mm for 60: 30.5 V for 30, 1 mm of √(0.5² + (60 · 0.5°)²) = 0.7240 mm allowed.
    expect(saidOf(triangle([first]), 'h1')).toMatchObject({
      magnitude: 30.5,
      angle: 0,
      magnitudeError: 0.5,
      angleError: 0,
      vectorError: 0.5,
      millimetres: 1,
      allowed: expect.closeTo(0.724, 4),
      within: false,
    })
  })

  it('is right by itself where only what came before it is wrong', () => {
    const said = saidOf(triangle([first, second]), 'h2')
    expect(said).toMatchObject({ vectorError: 0, within: true })
    expect(said.ownError).toMatchObject({ real: 0, imaginary: 0 })
    expect(said.inheritedError).toMatchObject({ real: 0.5, imaginary: 0 })
  })

  it('that closes the sum is compared with the exact resultant, and inherits what the terms missed', () => {
    const said = saidOf(triangle([first, second, closing]), 'h3')
    expect(said.magnitude).toBeCloseTo(Math.hypot(30.5, 40), 12)
    expect(said.vectorError).toBeCloseTo(0.5, 12)
    expect(said.ownError.magnitude).toBeCloseTo(0, 12)
    expect(said.inheritedError).toMatchObject({ magnitude: expect.closeTo(0.5, 12) })
    // 1 mm at a length of 100 mm: √(0.5² + 0.8727²) = 1.0058 mm is allowed.
    expect(said).toMatchObject({ allowed: expect.closeTo(1.0058, 4), within: true })
  })

  it('that closes a sum of which nothing else was drawn has all its error for its own', () => {
    const said = saidOf(triangle([closing]), 'h3')
    expect(said.ownError.magnitude).toBeCloseTo(0.5, 12)
    expect(said.inheritedError.magnitude).toBe(0)
  })

  it('of a term that is taken off is drawn reversed and counts turned round', () => {
    const sheet = triangle([{ ...first, to: at(-10, 50) }], {
      sums: [{ id: 's1', terms: [{ phasor: 'V1', sign: -1 }, { phasor: 'V2' }] }],
    })
    expect(saidOf(sheet, 'h1')).toMatchObject({ magnitude: 30, angle: 0, vectorError: 0 })
  })

  it('that stands for a phasor by itself inherits nothing', () => {
    const sheet = triangle([{ id: 'h1', stands: 'V2', from: at(3, 4), to: at(3, 84.4) }])
    expect(saidOf(sheet, 'h1')).toMatchObject({
      angle: 90,
      magnitudeError: expect.closeTo(0.2, 9),
      inheritedError: { magnitude: 0 },
      within: true,
    })
  })

  it('drawn from one origin inherits nothing from the others but through where it begins', () => {
    const sheet = triangle([first, { ...second, from: at(50, 50), to: at(50, 130) }, closing], {
      sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], arrangement: 'from-origin' }],
    })
    expect(saidOf(sheet, 'h2').inheritedError.magnitude).toBe(0)
    expect(saidOf(sheet, 'h3').inheritedError.magnitude).toBeCloseTo(0.5, 12)
  })

  it('of a phasor that is two terms is taken for the first that is left', () => {
    const sheet = triangle(
      [
        { ...first, to: at(110, 50) },
        { ...first, id: 'h2', from: at(110, 50), to: at(170, 50) },
      ],
      { sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V1' }] }] },
    )
    expect(saidOf(sheet, 'h2').inheritedError.magnitude).toBe(0)
  })

  it('has no direction where it has no length', () => {
    const said = saidOf(triangle([{ ...first, to: first.from }]), 'h1')
    expect(said).toMatchObject({ magnitude: 0, magnitudeError: -30, within: false })
    expect(said).not.toHaveProperty('angle')
    expect(said).not.toHaveProperty('angleError')
  })

  it('says nothing without a scale, and compares nothing with what is open', () => {
    expect(quick(triangle([first], { drawing: {} })).hand).toEqual([{ id: 'h1' }])
    const open = triangle([first], {
      phasors: [{ id: 'V1', label: 'V1', quantity: 'voltage' }, polar('V2', '40', '90')],
    })
    expect(quick(open).hand).toEqual([{ id: 'h1', magnitude: 30.5, angle: 0 }])
  })

  it('is held to the tolerance that the sheet states', () => {
    const drawing = {
      unitsPerCentimetre: { voltage: 5 },
      tolerance: { millimetres: 1, degrees: 0 },
    }
    expect(saidOf(triangle([first], { drawing }), 'h1')).toMatchObject({ allowed: 1, within: true })
  })

  it('is not there where nothing was drawn', () => {
    expect(quick(triangle(undefined)).hand).toEqual([])
  })
})

describe('the arrow that contributes most to the miss', () => {
  it('is the one whose own error lies along it, not the one that inherits it', () => {
    const sheet = triangle([first, second, closing])
    const most = largestContribution(sheet, quick(sheet), 's1')
    expect(most?.arrow.id).toBe('h1')
    expect(most?.amount).toBeCloseTo(0.5, 12)
  })

  it('is nobody where nothing is missed', () => {
    const sheet = triangle([{ ...first, to: at(110, 50) }])
    expect(largestContribution(sheet, quick(sheet), 's1')).toBeUndefined()
    expect(largestContribution(triangle(undefined), quick(sheet), 's1')).toBeUndefined()
  })
})

describe('in any construction', () => {
  it('own and inherited error add up to that of the tip', () => {
    fc.assert(
      fc.property(anyBuilt, (built) => {
        const sheet = sheetOfBuilt(built)
        const perMillimetre = built.scale / 10
        const exact = quick(sheet)
        let tip = { re: 0, im: 0 }
        built.strokes.forEach(({ sign }, index) => {
          const arrow = sheet.hand?.[index]
          const value = exact.phasors[index]
          if (!arrow || value?.real === undefined || value.imaginary === undefined)
            throw new Error()
          const start = built.arrangement === 'from-origin' ? { re: 0, im: 0 } : tip
          tip = { re: start.re + sign * value.real, im: start.im + sign * value.imaginary }
          const { ownError, inheritedError } = saidOf(sheet, arrow.id)
          const total = {
            re: (arrow.to.x - built.start.x) * perMillimetre - tip.re,
            im: (arrow.to.y - built.start.y) * perMillimetre - tip.im,
          }
          expect(ownError.real + inheritedError.real).toBeCloseTo(total.re, 6)
          expect(ownError.imaginary + inheritedError.imaginary).toBeCloseTo(total.im, 6)
        })
      }),
    )
  })

  it('the own errors add up to that of the closing arrow, where each tail lies on the tip before', () => {
    fc.assert(
      fc.property(anyBuilt, (loose) => {
        const strokes = loose.strokes.map((each) => ({ ...each, aside: { x: 0, y: 0 } }))
        const sheet = sheetOfBuilt({ ...loose, strokes })
        const said = quick(sheet).hand
        const total = saidOf(sheet, 'h')
        const sum = said.reduce(
          (all, { ownError }) => ({
            real: all.real + (ownError?.real ?? 0),
            imaginary: all.imaginary + (ownError?.imaginary ?? 0),
          }),
          { real: 0, imaginary: 0 },
        )
        expect(Math.hypot(sum.real, sum.imaginary)).toBeCloseTo(total.vectorError, 6)
        expect(total.ownError.real + total.inheritedError.real).toBeCloseTo(sum.real, 6)
        expect(total.ownError.imaginary + total.inheritedError.imaginary).toBeCloseTo(
          sum.imaginary,
          6,
        )
      }),
    )
  })

  it('no verdict changes when all of it is turned or grown', () => {
    fc.assert(
      fc.property(
        anyBuilt,
        fc.double({ min: -180, max: 180, noNaN: true }),
        fc.double({ min: 0.1, max: 10, noNaN: true }),
        (built, degrees, factor) => {
          const verdicts = (sheet: Sheet) => quick(sheet).hand.map(({ within }) => within)
          const before = verdicts(sheetOfBuilt(built))
          expect(before).not.toContain(undefined)
          expect(verdicts(sheetOfBuilt(built, degrees, factor))).toEqual(before)
        },
      ),
    )
  })

  it('no verdict changes when values and scale grow together', () => {
    fc.assert(
      fc.property(anyBuilt, fc.double({ min: 0.01, max: 100, noNaN: true }), (built, factor) => {
        const grown = {
          ...built,
          scale: built.scale * factor,
          strokes: built.strokes.map((each) => ({ ...each, magnitude: each.magnitude * factor })),
        }
        const verdicts = (sheet: Sheet) => quick(sheet).hand.map(({ within }) => within)
        expect(verdicts(sheetOfBuilt(grown))).toEqual(verdicts(sheetOfBuilt(built)))
      }),
    )
  })
})
