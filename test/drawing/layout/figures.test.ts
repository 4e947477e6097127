import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { PlacedArrow } from '../../../src/drawing'
import { phasor, sheetOf, sum } from '../sheets'
import { sceneOf } from './scenes'

describe('figures of one quantity', () => {
  it('do not overlap', () => {
    const term = fc.record({
      magnitude: fc.double({ min: 0.1, max: 100, noNaN: true }),
      angle: fc.integer({ min: -179, max: 180 }),
    })
    const figures = fc.array(fc.array(term, { minLength: 1, maxLength: 4 }), {
      minLength: 2,
      maxLength: 6,
    })
    fc.assert(
      fc.property(figures, (sums) => {
        const phasors = sums.flatMap((terms, s) =>
          terms.map(({ magnitude, angle }, t) =>
            phasor(`V${s}x${t}`, String(magnitude), String(angle)),
          ),
        )
        const scene = sceneOf(
          sheetOf(phasors, {
            sums: sums.map((terms, s) =>
              sum(
                `s${s}`,
                terms.map((_, t) => `V${s}x${t}`),
              ),
            ),
          }),
        )
        const boxes = sums.map((_, s) =>
          boxOf(scene.arrows.filter((arrow) => arrow.sum === `s${s}`)),
        )
        for (const [index, one] of boxes.entries()) {
          for (const other of boxes.slice(index + 1)) expect(isApart(one, other)).toBe(true)
        }
      }),
    )
  })
})

function boxOf(arrows: readonly PlacedArrow[]): [number, number, number, number] {
  const xs = arrows.flatMap(({ from, to }) => [from.x, to.x])
  const ys = arrows.flatMap(({ from, to }) => [from.y, to.y])
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)]
}

function isApart(one: readonly number[], other: readonly number[]): boolean {
  const [left = 0, bottom = 0, right = 0, top = 0] = one
  const [left2 = 0, bottom2 = 0, right2 = 0, top2 = 0] = other
  return right < left2 || right2 < left || top < bottom2 || top2 < bottom
}
