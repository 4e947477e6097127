import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { Occupancy } from '../../../src/drawing/labels/occupancy'

const region = { left: 10, bottom: 10, right: 110, top: 90 }
const x = fc.double({ min: -20, max: 140, noNaN: true })
const y = fc.double({ min: -20, max: 120, noNaN: true })
const segment = fc.tuple(x, y, x, y)
const box = fc
  .tuple(
    x,
    y,
    fc.double({ min: 0.1, max: 30, noNaN: true }),
    fc.double({ min: 0.1, max: 10, noNaN: true }),
  )
  .map(([left, bottom, width, height]) => ({
    left,
    bottom,
    right: left + width,
    top: bottom + height,
  }))

describe('what is taken of a region', () => {
  it('has every point within reach of a segment', () => {
    const reach = fc.double({ min: 0, max: 2, noNaN: true })
    const along = fc.double({ min: 0, max: 1, noNaN: true })
    fc.assert(
      fc.property(segment, reach, along, along, ([x1, y1, x2, y2], by, part, turn) => {
        const occupancy = new Occupancy(region)
        occupancy.addSegment(x1, y1, x2, y2, by)
        occupancy.seal()
        const angle = turn * 2 * Math.PI
        const point = {
          x: x1 + (x2 - x1) * part + by * 0.999 * Math.cos(angle),
          y: y1 + (y2 - y1) * part + by * 0.999 * Math.sin(angle),
        }
        const speck = { left: point.x, bottom: point.y, right: point.x, top: point.y }
        expect(occupancy.isFree(speck)).toBe(false)
      }),
    )
  })

  it('leaves free what is well clear of it', () => {
    fc.assert(
      fc.property(segment, box, ([x1, y1, x2, y2], asked) => {
        const occupancy = new Occupancy(region)
        occupancy.addSegment(x1, y1, x2, y2, 0.5)
        occupancy.seal()
        const isInside =
          asked.left >= region.left &&
          asked.bottom >= region.bottom &&
          asked.right <= region.right &&
          asked.top <= region.top
        const isClear =
          Math.max(x1, x2) + 2 < asked.left ||
          Math.min(x1, x2) - 2 > asked.right ||
          Math.max(y1, y2) + 2 < asked.bottom ||
          Math.min(y1, y2) - 2 > asked.top
        if (!isInside) expect(occupancy.isFree(asked)).toBe(false)
        else if (isClear) expect(occupancy.isFree(asked)).toBe(true)
      }),
    )
  })

  it('is all of a box, and its share of a larger one', () => {
    const occupancy = new Occupancy(region)
    occupancy.addBox({ left: 40, bottom: 40, right: 59.9, top: 49.9 })
    occupancy.seal()
    expect(occupancy.isFree({ left: 50, bottom: 45, right: 51, top: 46 })).toBe(false)
    expect(occupancy.isFree({ left: 61, bottom: 45, right: 80, top: 50 })).toBe(true)
    expect(occupancy.share({ left: 40, bottom: 40, right: 59.9, top: 59.9 })).toBeCloseTo(0.5, 1)
    expect(occupancy.share({ left: 70, bottom: 70, right: 80, top: 80 })).toBe(0)
  })
})
