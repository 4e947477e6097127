import fc from 'fast-check'
import { expect, it } from 'vitest'
import { gripAt, type PlacedArrow, type Scene } from '../../src/drawing'
import { sheetOf } from './sheets'

const sheet = sheetOf([])
const coordinate = fc.double({ min: -400, max: 3_000, noNaN: true })
const place = fc.record({ x: coordinate, y: coordinate })
const nearby = fc.double({ min: -60, max: 60, noNaN: true })
const arrows = fc.array(fc.tuple(fc.oneof(place, fc.record({ x: nearby, y: nearby })), place), {
  maxLength: 30,
})

function sceneOf(pairs: readonly (readonly [PlacedArrow['from'], PlacedArrow['to']])[]): Scene {
  return {
    width: 297,
    height: 210,
    items: [],
    arrows: pairs.map(([from, to], index) => ({
      key: `hand:h${index}`,
      role: 'hand',
      hand: `h${index}`,
      sign: 1,
      quantity: 'voltage',
      from,
      to,
    })),
    origin: { x: 0, y: 0 },
    unitsPerCentimetre: {},
    starts: new Map(),
    title: '',
    description: '',
    labelsLeftOut: 0,
  }
}

/** How far a place is from a shaft, by looking at many points of it. */
function away({ from, to }: PlacedArrow, { x, y }: { x: number; y: number }): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y]
  const squared = dx * dx + dy * dy
  const along = squared === 0 ? 0 : ((x - from.x) * dx + (y - from.y) * dy) / squared
  const part = Math.min(1, Math.max(0, along))
  return Math.hypot(from.x + part * dx - x, from.y + part * dy - y)
}

it('finds by their place the arrows that a look at every one of them finds', () => {
  fc.assert(
    fc.property(
      arrows,
      place,
      fc.double({ min: 0.5, max: 30, noNaN: true }),
      (pairs, at, reach) => {
        const scene = sceneOf(pairs)
        const found = gripAt(sheet, scene, at, reach)
        const tips = scene.arrows.map(({ to }) => Math.hypot(to.x - at.x, to.y - at.y))
        const bodies = scene.arrows.map((arrow) => away(arrow, at))
        const tip = Math.min(...tips)
        const body = Math.min(...bodies)
        if (tip <= reach) {
          expect(found).toMatchObject({ at: 'tip', arrow: scene.arrows[tips.indexOf(tip)] })
        } else if (body < reach - 1e-6) {
          expect(found?.at).toBe('body')
          expect(away(found?.arrow as PlacedArrow, at)).toBeCloseTo(body, 6)
        } else if (body > reach + 1e-6) {
          expect(found).toBeUndefined()
        }
      },
    ),
  )
})
