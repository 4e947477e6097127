import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { headOf } from '../../../src/drawing/items/head'
import { HEADS, type HeadShape } from '../../../src/drawing/items/style'

const shapes = Object.keys(HEADS) as HeadShape[]
const length = fc.double({ min: 1e-6, max: 300, noNaN: true })
const heading = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true })

function drawn(shape: HeadShape, size: number, angle: number, heavy: boolean) {
  const factor = heavy ? 1.45 : 1
  const [headLength, headReach] = HEADS[shape]
  const style = {
    shape,
    colour: '#000000',
    width: heavy ? 1.1 : 0.5,
    headLength: headLength * factor,
    headReach: headReach * factor,
  }
  const direction = { x: Math.cos(angle), y: Math.sin(angle) }
  const head = headOf({ x: 100, y: 80 }, direction, size, style)
  const behind: number[] = []
  const aside: number[] = []
  for (let at = 0; at < head.points.length; at += 2) {
    const [x, y] = [(head.points[at] ?? 0) - 100, (head.points[at + 1] ?? 0) - 80]
    behind.push(-(x * direction.x + y * direction.y))
    aside.push(Math.abs(x * direction.y - y * direction.x))
  }
  return { head, behind, aside }
}

describe.each(shapes)('an arrowhead that is %s', (shape) => {
  it('reaches to the tip and not beyond', () => {
    fc.assert(
      fc.property(length, heading, fc.boolean(), (size, angle, heavy) => {
        const { behind } = drawn(shape, size, angle, heavy)
        expect(Math.min(...behind)).toBeCloseTo(0, 9)
      }),
    )
  })

  it('leaves a shaft, however short the arrow', () => {
    fc.assert(
      fc.property(length, heading, fc.boolean(), (size, angle, heavy) => {
        const { behind, head } = drawn(shape, size, angle, heavy)
        expect(Math.max(...behind)).toBeLessThan(0.6001 * size)
        expect(head.shaftEnd).toBeLessThan(0.6 * size)
        expect(head.shaftEnd).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  it('is broader than its shaft', () => {
    fc.assert(
      fc.property(length, heading, fc.boolean(), (size, angle, heavy) => {
        const { aside, head } = drawn(shape, size, angle, heavy)
        expect(2 * Math.max(...aside)).toBeGreaterThan(1.5 * head.width)
      }),
    )
  })
})
