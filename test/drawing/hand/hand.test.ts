import { describe, expect, it } from 'vitest'
import {
  dragTip,
  dropAt,
  handArrowAt,
  type LayoutOptions,
  layout,
  measureOf,
  nudge,
  type PlacedArrow,
  placeStroke,
  type Scene,
  snapTail,
  strokeTo,
  typeHandArrow,
} from '../../../src/drawing'
import { crossings } from '../../../src/drawing/hand/compasses'
import { apply, type Edit, quick, type Sheet } from '../../../src/sheet'
import { phasor, sheetOf, sum } from '../sheets'

const drawing = { origin: { x: 50, y: 50 }, unitsPerCentimetre: { voltage: 5 } }
const triangle = sheetOf([phasor('V1', '30', '0'), phasor('V2', '40', '90')], {
  sums: [sum('s1', ['V1', 'V2'])],
  drawing,
})

function sceneOf(sheet: Sheet, options: LayoutOptions = {}): Scene {
  return layout(sheet, quick(sheet), { labels: false, ...options })
}

function applied(sheet: Sheet, edit: Edit | undefined): Sheet {
  if (!edit) throw new Error('There is no edit.')
  const result = apply(sheet, edit)
  if (!result.ok) throw new Error(result.problem)
  return result.value
}

function typed(sheet: Sheet, position: number | 'closing', millimetres: number, degrees: number) {
  const edit = typeHandArrow(sheet, sceneOf(sheet), 's1', position, { millimetres, degrees })
  return applied(sheet, edit)
}

function arrowIn(scene: Scene, key: string): PlacedArrow {
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}.`)
  return arrow
}

describe('a construction that is typed', () => {
  it('begins where the sum does, each arrow on the tip of the one before', () => {
    const sheet = typed(typed(typed(triangle, 0, 61, 0), 1, 80, 90), 'closing', 100, 53)
    expect(sheet.hand?.map(({ from }) => from)).toEqual([
      { x: 50, y: 50 },
      { x: 111, y: 50 },
      { x: 50, y: 50 },
    ])
    expect(sheet.hand?.[1]?.to).toEqual({ x: 111, y: 130 })
  })

  it('may be typed in any order: a term that comes later pushes the next ones on', () => {
    const sheet = typed(typed(triangle, 1, 80, 90), 0, 61, 0)
    expect(handArrowAt(sheet, 's1', 1)).toMatchObject({
      from: { x: 111, y: 50 },
      to: { x: 111, y: 130 },
    })
  })

  it('stays together when one of it is drawn anew, the joined closing arrow with it', () => {
    const both = typed(typed(triangle, 0, 60, 0), 1, 80, 90)
    const closed = typed(both, 'closing', 100, (Math.atan2(80, 60) * 180) / Math.PI)
    const joined = applied(closed, {
      kind: 'set-hand-arrow',
      id: 'h3',
      sum: 's1',
      stands: 'closing',
      from: { x: 50, y: 50 },
      to: handArrowAt(closed, 's1', 1)?.to ?? { x: 0, y: 0 },
    })
    const after = typed(joined, 0, 62, 0)
    expect(handArrowAt(after, 's1', 1)?.from).toEqual({ x: 112, y: 50 })
    expect(handArrowAt(after, 's1', 'closing')).toMatchObject({
      from: { x: 50, y: 50 },
      to: { x: 112, y: 130 },
    })
  })
})

describe('what a hand drew', () => {
  const drawn = typed(typed(typed(triangle, 0, 61, 0), 1, 80, 90), 'closing', 100, 52)

  it('lies on the paper beside the exact drawing, with a bar from its tip to the exact one', () => {
    const scene = sceneOf(drawn)
    expect(arrowIn(scene, 'hand:h1').to).toEqual({ x: 111, y: 50 })
    const bar = scene.items.find(({ part, arrow }) => part === 'gap' && arrow === 'hand:h1')
    if (bar?.kind !== 'lines') throw new Error('There is no bar.')
    const [fromX, fromY, toX, toY] = bar.segments as [number, number, number, number]
    expect([fromX, fromY]).toEqual([111, 50])
    expect(toX).toBeCloseTo(110, 9)
    expect(toY).toBeCloseTo(50, 9)
  })

  it('stands alone while its sum is hidden: nothing exact, and no bar that would betray it', () => {
    const scene = sceneOf(drawn, { hidden: new Set(['s1']) })
    expect(scene.arrows.map(({ role }) => role)).toEqual(['hand', 'hand', 'hand'])
    expect(scene.items.some(({ part }) => part === 'gap' || part === 'angle')).toBe(false)
  })

  it('keeps origin and scale of what is hidden', () => {
    const shown = sceneOf(triangle)
    const hidden = sceneOf(triangle, { hidden: new Set(['s1']) })
    expect(hidden.unitsPerCentimetre).toEqual(shown.unitsPerCentimetre)
    expect(hidden.origin).toEqual(shown.origin)
  })

  it('is dragged to tenths of a millimetre and of a degree', () => {
    const scene = sceneOf(drawn)
    const at = { x: 112.34, y: 50.2 }
    const result = dragTip(drawn, quick(drawn), scene, arrowIn(scene, 'hand:h1'), at, false)
    if (!result.ok) throw new Error(result.problem)
    expect(result.value).toMatchObject({ millimetres: 62.3, angle: 0.2 })
    const { hand } = applied(drawn, result.value.edit)
    expect(hand?.[1]?.from).toEqual(hand?.[0]?.to)
  })

  it('is nudged in length and angle by itself', () => {
    const scene = sceneOf(drawn)
    const by = { millimetres: 0.1, degrees: 0 }
    const result = nudge(drawn, quick(drawn), scene, arrowIn(scene, 'hand:h2'), by)
    if (!result.ok) throw new Error(result.problem)
    const arrow = handArrowAt(applied(drawn, result.value), 's1', 1)
    if (!arrow) throw new Error('The arrow is gone.')
    expect(measureOf(arrow.from, arrow.to).millimetres).toBeCloseTo(80.1, 9)
  })
})

describe('a stroke', () => {
  const scene = sceneOf(triangle)

  it('begins at an origin or a tip within reach, else where it was pressed', () => {
    expect(snapTail(triangle, scene, { x: 51, y: 49 }, 3, 'hand')).toEqual({ at: { x: 50, y: 50 } })
    expect(snapTail(triangle, scene, { x: 109, y: 51 }, 3, 'phasor')).toEqual({
      at: { x: 110, y: 50 },
      tipOf: 'V1',
    })
    const free = { x: 200, y: 150 }
    expect(snapTail(triangle, scene, free, 3, 'phasor')).toEqual({ at: free })
  })

  it('of a construction does not hang on the exact drawing, which would betray it', () => {
    const press = { x: 109, y: 51 }
    expect(snapTail(triangle, scene, press, 3, 'hand')).toEqual({ at: press })
  })

  it('snaps to whole millimetres and degrees as a phasor, to tenths as a construction', () => {
    const tail = { at: { x: 50, y: 50 } }
    const place = { x: 90.3, y: 60.2 }
    expect(strokeTo(triangle, tail, place, 'phasor', false)).toMatchObject({
      millimetres: 42,
      degrees: 14,
    })
    expect(strokeTo(triangle, tail, place, 'hand', false)).toMatchObject({
      millimetres: 41.6,
      degrees: 14.2,
    })
  })

  it('becomes a phasor with the scale of the drawing, hung on the tip that it begins at', () => {
    const tail = snapTail(triangle, scene, { x: 110, y: 50 }, 3, 'phasor')
    const stroke = strokeTo(triangle, tail, { x: 110, y: 80 }, 'phasor', false)
    const meaning = { kind: 'phasor', label: 'V3', quantity: 'voltage' } as const
    const result = placeStroke(triangle, scene, stroke, meaning)
    if (!result.ok) throw new Error(result.problem)
    expect(applied(triangle, result.value).phasors.at(-1)).toMatchObject({
      magnitude: { value: 15, text: '15.0' },
      angle: { value: 90, text: '90' },
      tail: { tipOf: 'V1' },
    })
  })

  it('is refused in a construction without a scale', () => {
    const open = sheetOf([{ id: 'V1', label: 'V1', quantity: 'voltage' }], {
      sums: [sum('s1', ['V1'])],
    })
    const stroke = strokeTo(open, { at: { x: 0, y: 0 } }, { x: 9, y: 0 }, 'hand', false)
    const meaning = { kind: 'hand', sum: 's1', position: 0 } as const
    expect(placeStroke(open, sceneOf(open), stroke, meaning).ok).toBe(false)
  })
})

describe('a loose phasor that is let go', () => {
  const sheet = sheetOf([...triangle.phasors, phasor('V3', '10', '45'), phasor('V4', '9', '0')], {
    sums: [sum('s1', ['V1', 'V2'])],
    drawing,
  })
  const scene = sceneOf(sheet)

  it('on the tip of a term becomes the next term', () => {
    const drop = dropAt(sheet, scene, arrowIn(scene, 'loose:V3'), { x: 111, y: 50 }, 3)
    expect(drop).toMatchObject({ sum: 's1', on: 'V1' })
    const { sums } = applied(sheet, drop?.edit)
    expect(sums?.[0]?.terms.map((term) => term.phasor)).toEqual(['V1', 'V3', 'V2'])
  })

  it('on the tip of a loose one hangs there, but never on its own', () => {
    const tip = arrowIn(scene, 'loose:V4').to
    const drop = dropAt(sheet, scene, arrowIn(scene, 'loose:V3'), tip, 3)
    const hung = applied(sheet, drop?.edit)
    expect(hung.phasors[2]?.tail).toEqual({ tipOf: 'V4' })
    const next = sceneOf(hung)
    const end = arrowIn(next, 'loose:V3').to
    expect(dropAt(hung, next, arrowIn(next, 'loose:V4'), end, 3)).toBeUndefined()
  })
})

describe('construction lines', () => {
  const linesOf = (sheet: Sheet, construction: LayoutOptions['construction'] = {}) =>
    sceneOf(sheet, { construction }).items.filter(({ part }) => part === 'construction')

  it('are drawn on request alone', () => {
    expect(linesOf(triangle)).toEqual([])
  })

  it('complete the parallelogram of two terms', () => {
    const [item] = linesOf(triangle, { parallels: true })
    if (item?.kind !== 'lines') throw new Error('There are no parallels.')
    expect(item.segments).toEqual([50, 50, 50, 130, 50, 130, 110, 130, 110, 50, 110, 130])
  })

  it('swing the compasses about both ends of a corner', () => {
    const swings = linesOf(triangle, { arcs: true })
    expect(
      swings.map((item) => item.kind === 'arc' && [item.centre.x, item.centre.y, item.radius]),
    ).toEqual([
      [50, 50, 60],
      [110, 130, 80],
    ])
  })

  it('find the corner of a triangle of which two sides have a length and no angle', () => {
    const sized = (id: string, value: number) =>
      ({ id, label: id, quantity: 'voltage', magnitude: { value } }) as const
    const sheet = sheetOf([phasor('V1', '30', '0'), sized('V2', 40), sized('VS', 50)], {
      sums: [sum('s1', ['V1', 'V2'], { equals: 'VS' })],
      drawing,
    })
    const swings = linesOf(sheet, { arcs: true })
    // The sides 60, 80 and 100 mm have a right angle at the tip of V1: 80 mm above it, or below.
    expect(swings).toHaveLength(4)
    expect(
      crossings(
        { centre: { x: 50, y: 50 }, radius: 100 },
        { centre: { x: 110, y: 50 }, radius: 80 },
      ),
    ).toEqual([
      { x: expect.closeTo(110, 9), y: expect.closeTo(130, 9) },
      { x: expect.closeTo(110, 9), y: expect.closeTo(-30, 9) },
    ])
  })
})

describe('a layout of what a drag touches', () => {
  it('places each arrow where the whole layout does', () => {
    const loose = phasor('V5', '12', '30')
    const sheet = sheetOf(
      [...triangle.phasors, { ...loose, tail: { tipOf: 'V2' } }, phasor('V6', '7', '10')],
      { sums: [sum('s1', ['V1', 'V2'])] },
    )
    const base = sceneOf(sheet)
    const draft = applied(sheet, { kind: 'drag-tip', id: 'V5', magnitude: 9, angle: 80 })
    const whole = sceneOf(draft, { frozen: base })
    const part = sceneOf(draft, { frozen: base, within: new Set(['loose:V5']) })
    expect(part.arrows.length).toBeLessThan(whole.arrows.length)
    for (const arrow of part.arrows) expect(arrow).toEqual(arrowIn(whole, arrow.key))
    expect(part.arrows.some(({ key }) => key === 'loose:V5')).toBe(true)
  })
})
