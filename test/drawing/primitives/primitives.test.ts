import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { boundsOf, distance, type Item } from '../../../src/drawing'

const stroke = { part: 'arrow', stroke: '#000000', width: 0.5 } as const
const lines: Item = { ...stroke, kind: 'lines', segments: [0, 0, 10, 0, 20, 5, 20, 15] }
const triangle: Item = {
  part: 'arrow',
  kind: 'path',
  points: [0, 0, 10, 0, 5, 10],
  closed: true,
  fill: '#000000',
}
const hollow: Item = { ...stroke, kind: 'path', points: [0, 0, 10, 0, 5, 10], closed: true }
const arc: Item = {
  ...stroke,
  kind: 'arc',
  centre: { x: 5, y: 5 },
  radius: 10,
  start: 0,
  sweep: 135,
}
const dot: Item = {
  part: 'arrow',
  kind: 'arc',
  centre: { x: 5, y: 5 },
  radius: 2,
  start: 0,
  sweep: 360,
  fill: '#000000',
}
const text: Item = {
  part: 'label',
  kind: 'text',
  at: { x: 50, y: 20 },
  anchor: 'end',
  runs: [{ text: 'V', face: 'symbol', size: 5 }],
  fill: '#000000',
}

describe('the bounds of an item', () => {
  it('hold its ends, and the turning points of an arc', () => {
    expect(boundsOf(lines)).toEqual({ left: 0, bottom: 0, right: 20, top: 15 })
    expect(boundsOf(triangle)).toEqual({ left: 0, bottom: 0, right: 10, top: 10 })
    const { left, bottom, right, top } = boundsOf(arc)
    expect([left, bottom, right, top].map((value) => Number(value.toFixed(6)))).toEqual([
      -2.071068, 5, 15, 15,
    ])
    expect(boundsOf(dot)).toEqual({ left: 3, bottom: 3, right: 7, top: 7 })
  })

  it('of a text end where it is anchored, and reach below its baseline', () => {
    const { left, bottom, right, top } = boundsOf(text)
    expect(right).toBe(50)
    expect(left).toBeLessThan(48)
    expect(bottom).toBeLessThan(20)
    expect(top).toBeGreaterThan(23)
  })
})

describe('the distance from an item', () => {
  it('is that from the nearest stroke', () => {
    expect(distance(lines, { x: 5, y: 3 })).toBe(3)
    expect(distance(lines, { x: 23, y: 19 })).toBe(5)
  })

  it('is nothing inside what is filled, and that from the outline elsewhere', () => {
    expect(distance(triangle, { x: 5, y: 3 })).toBe(0)
    expect(distance(triangle, { x: 5, y: -3 })).toBe(3)
    expect(distance(hollow, { x: 5, y: 3 })).toBeGreaterThan(2)
    expect(distance(dot, { x: 6, y: 5 })).toBe(0)
    expect(distance(dot, { x: 5, y: 10 })).toBe(3)
  })

  it('is that from an arc where it is, and from its ends where it is not', () => {
    expect(distance(arc, { x: 5, y: 17 })).toBeCloseTo(2, 9)
    expect(distance(arc, { x: 5, y: 5 })).toBeCloseTo(10, 9)
    expect(distance(arc, { x: 15, y: 2 })).toBeCloseTo(3, 9)
  })

  it('from a text is that from its box', () => {
    expect(distance(text, { x: 49, y: 21 })).toBe(0)
    expect(distance(text, { x: 54, y: 21 })).toBe(4)
  })

  it('is never less than that from the bounds', () => {
    const place = fc.record({
      x: fc.double({ min: -50, max: 80, noNaN: true }),
      y: fc.double({ min: -50, max: 80, noNaN: true }),
    })
    fc.assert(
      fc.property(fc.constantFrom(lines, triangle, arc, dot, text), place, (item, point) => {
        const { left, bottom, right, top } = boundsOf(item)
        const across = Math.max(left - point.x, 0, point.x - right)
        const along = Math.max(bottom - point.y, 0, point.y - top)
        expect(distance(item, point)).toBeGreaterThanOrEqual(Math.hypot(across, along) - 1e-9)
      }),
    )
  })
})
