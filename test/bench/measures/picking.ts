import { gripAt, layout } from '../../../src/drawing'
import { type Place, quick } from '../../../src/sheet'
import { looseSheet } from '../board/sheets'
import { type Measure, millisecondsOf, ratioOfMedians } from '../measure'

const reach = 3

/** Places all over the paper, and some beside it, in a fixed order. */
const places: readonly Place[] = Array.from({ length: 500 }, (_, index) => ({
  x: ((index * 61) % 320) - 10,
  y: ((index * 43) % 230) - 10,
}))

/** Finding what a pointer takes hold of, against measuring the distance to every tip and shaft. */
export const picking2000: Measure = {
  name: 'picking among 2,000 phasors, against a linear scan of the distances to them',
  goal: 1,
  measure: async () => {
    const sheet = looseSheet(2_000)
    const scene = layout(sheet, quick(sheet), { labels: false })
    let picked = 0
    const pick = () => {
      for (const place of places) if (gripAt(sheet, scene, place, reach)) picked += 1
    }
    let nearest = 0
    const scan = () => {
      for (const { x, y } of places) {
        let least = Number.POSITIVE_INFINITY
        for (const { from, to } of scene.arrows) {
          const [dx, dy] = [to.x - from.x, to.y - from.y]
          const along = ((x - from.x) * dx + (y - from.y) * dy) / (dx * dx + dy * dy)
          const part = Math.min(1, Math.max(0, along))
          const [aside, above] = [from.x + part * dx - x, from.y + part * dy - y]
          const away = Math.sqrt(aside * aside + above * above)
          if (away < least) least = away
        }
        nearest += least
      }
    }
    const ratio = await ratioOfMedians(
      { ours: () => millisecondsOf(pick), theirs: () => millisecondsOf(scan) },
      30,
    )
    if (picked === 0 || !Number.isFinite(nearest)) throw new Error('Nothing was picked.')
    return ratio
  },
}
