import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layout, type PlacedArrow, trace } from '../../src/drawing'
import { type Phasor, quick, type Sheet, type Sum } from '../../src/sheet'
import { fan, phasor, sheetOf, sum } from './sheets'

/** What the scene says beside what the trace foretells, when a phasor gets a new value. */
function followed(sheet: Sheet, id: string, key: string, magnitude: number, angle: number) {
  const before = layout(sheet, quick(sheet), { labels: false })
  const changed = sheet.phasors.map((each) =>
    each.id === id ? { ...each, magnitude: { value: magnitude }, angle: { value: angle } } : each,
  )
  const after = layout({ ...sheet, phasors: changed }, quick({ ...sheet, phasors: changed }), {
    labels: false,
    frozen: before,
  })
  return { before, after, ...trace(sheet, before, id, key) }
}

const byKey = (arrows: readonly PlacedArrow[]) => new Map(arrows.map((arrow) => [arrow.key, arrow]))
const ids = ['A', 'B', 'C', 'D', 'E', 'F']
const value = fc.record({
  magnitude: fc.double({ min: 0.5, max: 50, noNaN: true }),
  angle: fc.integer({ min: -179, max: 180 }),
})
const term = fc.record({
  phasor: fc.constantFrom(...ids.slice(0, 4)),
  sign: fc.constantFrom<1 | -1>(1, -1),
})
const sums: fc.Arbitrary<Sum[]> = fc
  .array(
    fc.record({
      terms: fc.array(term, { minLength: 1, maxLength: 5 }),
      equals: fc.option(fc.constantFrom<string | 0>('D', 'E', 0), { nil: undefined }),
      arrangement: fc.constantFrom('tip-to-tail', 'from-origin'),
    }),
    { maxLength: 3 },
  )
  .map((parts) =>
    parts.map(({ terms, equals, arrangement }, index) => ({
      id: `s${index}`,
      terms,
      arrangement,
      ...(equals !== undefined && { equals }),
    })),
  )
const tails = fc.array(fc.option(fc.constantFrom(...ids), { nil: undefined }), {
  minLength: 6,
  maxLength: 6,
})

describe('what follows a phasor whose value changes', () => {
  it('is foretold: what is carried moves as the dragged tip does, what is not named stays', () => {
    fc.assert(
      fc.property(
        fc.array(value, { minLength: 6, maxLength: 6 }),
        sums,
        tails,
        value,
        fc.nat(),
        (values, drawn, hung, next, pick) => {
          const phasors = ids.map((id, index): Phasor => {
            const { magnitude = 1, angle = 0 } = values[index] ?? {}
            const on = hung[index]
            const plain = phasor(id, String(magnitude), String(angle))
            return on === undefined || on === id ? plain : { ...plain, tail: { tipOf: on } }
          })
          const sheet = sheetOf(phasors, { sums: drawn, reference: 'F' })
          const scene = layout(sheet, quick(sheet), { labels: false })
          const draggable = scene.arrows.filter(
            (arrow) => arrow.phasor !== undefined && arrow.phasor !== 'F',
          )
          const dragged = draggable[pick % draggable.length]
          if (dragged?.phasor === undefined) return
          const { before, after, live, carried } = followed(
            sheet,
            dragged.phasor,
            dragged.key,
            next.magnitude,
            next.angle,
          )
          const now = byKey(after.arrows)
          const tip = now.get(dragged.key)?.to ?? dragged.to
          const by = { x: tip.x - dragged.to.x, y: tip.y - dragged.to.y }
          for (const arrow of before.arrows) {
            if (live.has(arrow.key)) continue
            const shift = carried.has(arrow.key) ? by : { x: 0, y: 0 }
            const moved = now.get(arrow.key)
            expect(moved?.from.x).toBeCloseTo(arrow.from.x + shift.x, 8)
            expect(moved?.from.y).toBeCloseTo(arrow.from.y + shift.y, 8)
            expect(moved?.to.x).toBeCloseTo(arrow.to.x + shift.x, 8)
            expect(moved?.to.y).toBeCloseTo(arrow.to.y + shift.y, 8)
          }
        },
      ),
      { numRuns: 300 },
    )
  })

  it('in a chain is the terms after it, its resultant live', () => {
    const scene = layout(fan, quick(fan), { labels: false })
    const { live, carried } = trace(fan, scene, 'VR')
    expect([...live].sort()).toEqual(['resultant:s1', 'term:s1:0'])
    expect([...carried].sort()).toEqual(['term:s1:1', 'term:s1:2'])
  })

  it('is the resultant too, for the gap, where it is what the sum is compared with', () => {
    const scene = layout(fan, quick(fan), { labels: false })
    const { live, carried } = trace(fan, scene, 'VS')
    expect([...live].sort()).toEqual(['measured:s1', 'resultant:s1'])
    expect(carried.size).toBe(0)
  })

  it('is all that was read against it, with what follows that', () => {
    const against = { id: 'r1', of: 'B', kind: 'angle', shown: '20', against: 'A' } as const
    const sheet = sheetOf([phasor('F', '1', '0'), phasor('A', '9', '10'), phasor('B', '8', '0')], {
      reference: 'F',
      readings: [against],
      sums: [sum('s', ['B', 'F'])],
    })
    const scene = layout(sheet, quick(sheet), { labels: false })
    const { live, carried } = trace(sheet, scene, 'A')
    expect([...live].sort()).toEqual(['loose:A', 'resultant:s', 'term:s:0', 'term:s:1'])
    expect(carried.size).toBe(0)
  })

  it('does not move otherwise where the phasor is drawn twice in one sum', () => {
    const sheet = sheetOf([phasor('A', '9', '10'), phasor('B', '8', '0')], {
      sums: [sum('s', ['A', 'A', 'B'])],
    })
    const scene = layout(sheet, quick(sheet), { labels: false })
    expect([...trace(sheet, scene, 'A', 'term:s:0').carried]).toEqual([])
    expect([...trace(sheet, scene, 'A', 'term:s:1').carried]).toEqual(['term:s:2'])
  })
})
