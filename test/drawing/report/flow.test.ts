import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Item } from '../../../src/drawing'
import { type Block, flow, type Piece } from '../../../src/drawing/report/flow'

const columns = [
  { left: 0, right: 40, bottom: 10, top: 110 },
  { left: 50, right: 90, bottom: 10, top: 110 },
]

function piece(name: string, height = 10): Piece {
  return {
    height,
    draw: ({ x, y }): readonly Item[] => [
      {
        part: 'report',
        kind: 'text',
        at: { x, y },
        anchor: 'start',
        fill: '#000',
        runs: [{ text: name, face: 'sans', size: 1 }],
      },
    ],
  }
}

/** Where each piece stands: page, left edge, top. */
function placesOf(
  blocks: readonly Block[],
): readonly (readonly [string, number, number, number])[] {
  return flow(blocks, columns).flatMap(({ items }, page) =>
    items.flatMap((item) =>
      item.kind === 'text' ? [[item.runs[0]?.text ?? '', page, item.at.x, item.at.y] as const] : [],
    ),
  )
}

describe('blocks in columns', () => {
  test('stand one below the other, then in the next column, then on the next page', () => {
    const blocks = Array.from({ length: 21 }, (_, at) => ({ pieces: [piece(String(at))] }))
    const places = placesOf(blocks)
    expect(places[9]).toEqual(['9', 0, 0, 20])
    expect(places[10]).toEqual(['10', 0, 50, 110])
    expect(places[20]).toEqual(['20', 1, 0, 110])
  })

  test('a short block is not broken, a long one is', () => {
    const first = { pieces: [piece('a', 80)] }
    const short = { pieces: [piece('b'), piece('c'), piece('d')] }
    expect(placesOf([first, short]).map(([, , x]) => x)).toEqual([0, 50, 50, 50])
    const start = { pieces: [piece('a', 60)] }
    const long = { pieces: Array.from({ length: 9 }, (_, at) => piece(String(at))) }
    expect(placesOf([start, long]).map(([, , x]) => x)).toEqual([0, 0, 0, 0, 0, 50, 50, 50, 50, 50])
  })

  test('a heading stays with what follows it', () => {
    const heading = { pieces: [piece('heading')], isHeading: true as const }
    const places = placesOf([
      { pieces: [piece('a', 80)] },
      heading,
      { pieces: [piece('b'), piece('c')] },
    ])
    expect(places.find(([name]) => name === 'heading')).toEqual(['heading', 0, 50, 110])
  })

  test('the head of a table is drawn again where its rows go on', () => {
    const head = [piece('head')]
    const rows = Array.from({ length: 14 }, (_, at) => ({ pieces: [piece(String(at))], head }))
    const heads = placesOf(rows).filter(([name]) => name === 'head')
    expect(heads).toEqual([
      ['head', 0, 0, 110],
      ['head', 0, 50, 110],
    ])
  })

  test('nothing is lost, turned round, or set outside its column', () => {
    const height = fc.integer({ min: 1, max: 60 })
    const block = fc.record({
      heights: fc.array(height, { minLength: 1, maxLength: 6 }),
      isHeading: fc.boolean(),
      space: fc.integer({ min: 0, max: 8 }),
    })
    fc.assert(
      fc.property(fc.array(block, { maxLength: 20 }), (made) => {
        let count = 0
        const blocks = made.map(({ heights, isHeading, space }) => ({
          pieces: heights.map((own) => piece(`${count++} ${own}`, own)),
          isHeading,
          space,
        }))
        const places = placesOf(blocks)
        expect(places.map(([name]) => Number(name.split(' ')[0]))).toEqual(
          Array.from({ length: count }, (_, at) => at),
        )
        for (const [name, , , y] of places) {
          expect(y).toBeLessThanOrEqual(110)
          expect(y - Number(name.split(' ')[1])).toBeGreaterThanOrEqual(10 - 1e-6)
        }
      }),
      { seed: 71 },
    )
  })
})
