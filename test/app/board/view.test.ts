import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fitView, panView, toBoard, toPaper, zoomView } from '../../../src/app/board/view'

const paper = { width: 297, height: 210 }
const length = fc.double({ min: 200, max: 3000, noNaN: true })
const board = fc.record({ width: length, height: length })
const point = fc.record({
  x: fc.double({ min: -500, max: 3000, noNaN: true }),
  y: fc.double({ min: -500, max: 3000, noNaN: true }),
})

describe('the view of the paper', () => {
  it('shows the whole paper when it fits it', () => {
    fc.assert(
      fc.property(board, (size) => {
        const view = fitView(size, paper)
        const left = toBoard(view, { x: 0, y: paper.height }, paper)
        const right = toBoard(view, { x: paper.width, y: 0 }, paper)
        expect(left.x).toBeGreaterThanOrEqual(0)
        expect(left.y).toBeGreaterThanOrEqual(0)
        expect(right.x).toBeLessThanOrEqual(size.width)
        expect(right.y).toBeLessThanOrEqual(size.height)
      }),
    )
  })

  it('goes from board to paper and back', () => {
    fc.assert(
      fc.property(board, point, (size, at) => {
        const view = fitView(size, paper)
        const back = toBoard(view, toPaper(view, at, paper), paper)
        expect(back.x).toBeCloseTo(at.x, 6)
        expect(back.y).toBeCloseTo(at.y, 6)
      }),
    )
  })

  it('keeps the place under the pointer while it zooms', () => {
    fc.assert(
      fc.property(board, point, fc.double({ min: 0.5, max: 2, noNaN: true }), (size, at, by) => {
        const view = fitView(size, paper)
        const before = toPaper(view, at, paper)
        const after = toPaper(zoomView(view, by, at), at, paper)
        expect(after.x).toBeCloseTo(before.x, 6)
        expect(after.y).toBeCloseTo(before.y, 6)
      }),
    )
  })

  it('never loses the paper from sight, however far it is moved', () => {
    fc.assert(
      fc.property(board, fc.double({ min: -1e5, max: 1e5, noNaN: true }), (size, by) => {
        const view = panView(fitView(size, paper), by, by, size, paper)
        expect(view.x).toBeLessThan(size.width)
        expect(view.y).toBeLessThan(size.height)
        expect(view.x + paper.width * view.scale).toBeGreaterThan(0)
        expect(view.y + paper.height * view.scale).toBeGreaterThan(0)
      }),
    )
  })
})
