import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { angleOf, differenceDegrees } from '../../src/core'
import {
  dragBody,
  dragTip,
  layout,
  type PlacedArrow,
  pinDrawing,
  type Scene,
  whyTipIsHeld,
} from '../../src/drawing'
import { apply, type Edit, quick, type Sheet } from '../../src/sheet'
import { phasor, sheetOf, sum } from './sheets'

function sceneOf(sheet: Sheet): Scene {
  return layout(sheet, quick(sheet), { labels: false })
}

function arrowIn(scene: Scene, key: string): PlacedArrow {
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}.`)
  return arrow
}

function applied(sheet: Sheet, edit: Edit): Sheet {
  const result = apply(sheet, edit)
  if (!result.ok) throw new Error(result.problem)
  return result.value
}

const chain = sheetOf(
  [phasor('V1', '24.0', '0'), phasor('V2', '30.0', '60'), phasor('V3', '10.0', '-90')],
  { sums: [sum('s', ['V1', 'V2', 'V3'])] },
)

function drag(sheet: Sheet, key: string, at: { x: number; y: number }, free = false) {
  const scene = sceneOf(sheet)
  return dragTip(sheet, quick(sheet), scene, arrowIn(scene, key), at, free)
}

describe('dragging a tip', () => {
  const scene = sceneOf(chain)
  const arrow = arrowIn(scene, 'term:s:1')
  const perMillimetre = (scene.unitsPerCentimetre.voltage ?? 0) / 10

  it('snaps to whole millimetres and whole degrees', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -60, max: 60, noNaN: true }),
        fc.double({ min: -60, max: 60, noNaN: true }),
        (x, y) => {
          const at = { x: arrow.from.x + x, y: arrow.from.y + y }
          const result = drag(chain, 'term:s:1', at)
          if (!result.ok) throw new Error(result.problem)
          const { millimetres, angle } = result.value
          expect(Math.abs(millimetres - Math.round(millimetres))).toBeLessThan(1e-9)
          expect(Number.isInteger(angle)).toBe(true)
          expect(Math.abs(millimetres - Math.hypot(x, y))).toBeLessThanOrEqual(0.5 + 1e-9)
          if (Math.hypot(x, y) < 1) return
          const aimed = angleOf({ re: x, im: y })
          expect(Math.abs(differenceDegrees(angle, aimed))).toBeLessThanOrEqual(0.5 + 1e-9)
        },
      ),
    )
  })

  it('takes tenths of both where it is freed', () => {
    const at = { x: arrow.from.x + 20.33, y: arrow.from.y + 7.77 }
    const result = drag(chain, 'term:s:1', at, true)
    if (!result.ok) throw new Error(result.problem)
    expect(result.value.millimetres).toBeCloseTo(21.8, 9)
    expect(result.value.angle).toBe(20.9)
  })

  it('puts the tip where the pointer is, to the snap, in the sheet that the edit makes', () => {
    const at = { x: arrow.from.x + 12, y: arrow.from.y - 16 }
    const result = drag(chain, 'term:s:1', at, true)
    if (!result.ok) throw new Error(result.problem)
    const after = applied(chain, pinDrawing(chain, scene, result.value.edit))
    const { to } = arrowIn(sceneOf(after), 'term:s:1')
    expect(Math.hypot(to.x - at.x, to.y - at.y)).toBeLessThan(0.1)
  })

  it('drags a term that is taken off by its reversed arrow', () => {
    const sheet = sheetOf([phasor('V1', '24.0', '0'), phasor('V2', '10.0', '90')], {
      sums: [sum('s', ['V1', '−V2'])],
    })
    const before = sceneOf(sheet)
    const { from } = arrowIn(before, 'term:s:1')
    const result = drag(sheet, 'term:s:1', { x: from.x, y: from.y - 20 })
    if (!result.ok) throw new Error(result.problem)
    expect(result.value.angle).toBe(90)
    expect(result.value.millimetres).toBeCloseTo(20, 9)
  })

  it('keeps the angle of the reference, and follows the pointer along it', () => {
    const { from } = arrowIn(scene, 'term:s:0')
    const result = drag(chain, 'term:s:0', { x: from.x + 33.2, y: from.y + 8 })
    if (!result.ok) throw new Error(result.problem)
    expect(result.value.angle).toBe(0)
    expect(result.value.magnitude).toBeCloseTo(33 * perMillimetre, 9)
  })

  it('keeps the tip of a phasor that a meter read, and says why', () => {
    const read: Sheet = {
      ...chain,
      phasors: chain.phasors.map(({ id, label, quantity }) => ({ id, label, quantity })),
      readings: [
        { id: 'r1', of: 'V2', kind: 'magnitude', shown: '30.0' },
        { id: 'r2', of: 'V2', kind: 'angle', shown: '60' },
        { id: 'r3', of: 'V1', kind: 'magnitude', shown: '24.0' },
        { id: 'r4', of: 'V3', kind: 'magnitude', shown: '10.0' },
        { id: 'r5', of: 'V3', kind: 'angle', shown: '-90' },
      ],
    }
    const arrowOfRead = arrowIn(sceneOf(read), 'term:s:1')
    expect(whyTipIsHeld(read, arrowOfRead)).toMatch(/V2 were read on a meter/)
    expect(drag(read, 'term:s:1', { x: 0, y: 0 }).ok).toBe(false)
  })

  it('refuses the resultant, which has terms to be dragged instead', () => {
    const result = drag(chain, 'resultant:s', { x: 0, y: 0 })
    expect(result).toMatchObject({ ok: false, problem: expect.stringMatching(/drag a term/) })
  })
})

describe('dragging a body', () => {
  it('moves a loose phasor by whole millimetres and nothing else', () => {
    const sheet = sheetOf([phasor('V1', '24.0', '0'), phasor('V2', '30.0', '60')])
    const scene = sceneOf(sheet)
    const arrow = arrowIn(scene, 'loose:V2')
    const edit = dragBody(sheet, scene, arrow, { x: 7.3, y: -3.6 }, false)
    if (!edit) throw new Error('The body did not move.')
    const after = sceneOf(applied(sheet, pinDrawing(sheet, scene, edit)))
    expect(arrowIn(after, 'loose:V2').from).toEqual({
      x: Math.round(arrow.from.x + 7.3),
      y: Math.round(arrow.from.y - 3.6),
    })
    expect(arrowIn(after, 'loose:V1')).toEqual(arrowIn(scene, 'loose:V1'))
  })

  it('moves the whole figure of a sum', () => {
    const scene = sceneOf(chain)
    const edit = dragBody(chain, scene, arrowIn(scene, 'term:s:2'), { x: 10, y: 5 }, false)
    if (!edit) throw new Error('The figure did not move.')
    const after = sceneOf(applied(chain, pinDrawing(chain, scene, edit)))
    for (const { key, from } of scene.arrows) {
      const moved = arrowIn(after, key).from
      expect(moved.x - from.x).toBeCloseTo(10, 9)
      expect(moved.y - from.y).toBeCloseTo(5, 9)
    }
  })
})
