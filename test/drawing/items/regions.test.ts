import { describe, expect, it } from 'vitest'
import { boundsOf, boundsOfAll, type Item, layout, svg } from '../../../src/drawing'
import { quick, type Sheet, serializeSheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { fan, phasor, sheetOf } from '../sheets'

const FACTOR = Math.sqrt(-2 * Math.log(0.05))

/** One voltage of 30 V at 0°, known to ± 1.2 V and ± 1°, at 5 V to the centimetre. */
const one: Sheet = {
  ...sheetOf([
    {
      id: 'V1',
      label: 'V1',
      quantity: 'voltage',
      magnitude: { value: 30, limit: 1.2 },
      angle: { value: 40, limit: 1 },
    },
    { ...phasor('I', '1.0', '0'), quantity: 'current' },
  ]),
  reference: 'I',
  drawing: { unitsPerCentimetre: { voltage: 5, current: 1 }, origin: { x: 60, y: 60 } },
}

function regionsOf(items: readonly Item[]): readonly Item[] {
  return items.filter(({ part, kind }) => part === 'region' && kind === 'path')
}

describe('the 95 % regions', () => {
  it('are drawn on request alone', () => {
    const evaluation = evaluate(fan)
    expect(regionsOf(layout(fan, evaluation).items)).toEqual([])
    const { items } = layout(fan, evaluation, { regions: evaluation })
    expect(regionsOf(items).length).toBeGreaterThan(2)
    expect(items.filter(({ part, kind }) => part === 'region' && kind === 'text').length).toBe(1)
  })

  it('are true to scale, about the tip of the best value', () => {
    const evaluation = evaluate(one)
    const scene = layout(one, evaluation, { regions: evaluation })
    const arrow = scene.arrows.find((each) => each.phasor === 'V1')
    const region = regionsOf(scene.items).find((item) => item.arrow === arrow?.key)
    const points = region?.kind === 'path' ? region.points : []
    const [cosine, sine] = [Math.cos((40 * Math.PI) / 180), Math.sin((40 * Math.PI) / 180)]
    let [along, across] = [0, 0]
    for (let at = 0; at < points.length; at += 2) {
      const x = (points[at] as number) - (arrow?.to.x ?? 0)
      const y = (points[at + 1] as number) - (arrow?.to.y ?? 0)
      along = Math.max(along, cosine * x + sine * y)
      across = Math.max(across, cosine * y - sine * x)
    }
    // Standard uncertainties are the limits over √3; 5 V to 10 mm.
    expect(along).toBeCloseTo((FACTOR * (1.2 / Math.sqrt(3)) * 10) / 5, 9)
    const degree = Math.PI / 180
    expect(across).toBeCloseTo((FACTOR * ((30 * degree) / Math.sqrt(3)) * 10) / 5, 3)
  })

  it('move nothing else', () => {
    const evaluation = evaluate(fan)
    const others = (items: readonly Item[]) => items.filter(({ part }) => part !== 'region')
    const bare = layout(fan, evaluation)
    const scene = layout(fan, evaluation, { regions: evaluation })
    expect(others(scene.items)).toEqual(bare.items)
    const caption = scene.items.filter(({ part, kind }) => part === 'region' && kind === 'text')
    const { left, right, bottom, top } = boundsOfAll(caption)
    for (const item of scene.items.filter(({ part }) => part === 'label' || part === 'scale-bar')) {
      const box = boundsOf(item)
      const isApart =
        right <= box.left || left >= box.right || top <= box.bottom || bottom >= box.top
      expect(isApart).toBe(true)
    }
  })

  it('are grey while they are of the sheet before', () => {
    const former = evaluate(fan)
    const inks = (items: readonly Item[]) =>
      new Set(items.map((item) => (item.kind === 'text' ? item.fill : item.stroke)))
    const grey = layout(fan, quick(fan), { former, regions: former }).items
    const sure = layout(fan, former, { regions: former }).items
    expect(inks(regionsOf(grey))).not.toEqual(inks(regionsOf(sure)))
    expect(inks(regionsOf(grey)).size).toBe(1)
  })

  it('stand in the SVG, with their caption', () => {
    const evaluation = evaluate(fan)
    const text = svg(layout(fan, evaluation, { regions: evaluation }), serializeSheet(fan))
    expect(text).toContain('95 % regions')
    expect(text).not.toMatch(/ style=/)
  })
})
