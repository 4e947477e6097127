import { cosDegrees, sinDegrees } from '../../core'
import type { Place } from '../../sheet'
import { boxToward, type Size, type Spot } from './spot'
import type { Wish } from './wish'

/** Where along a stretch a label may stand, 0 at its tail. */
const ALONG = [0.5, 0.4, 0.6, 0.3, 0.7, 0.8, 0.2, 0.9, 0.1, 1, 0]
/** What stays free between a label and what it names, and how far off it may stand without a leader. */
const CLEAR = 1.3
const STEPS = [0, 1.6, 3.4]
/** Directions past the tip, from the arrow's own. */
const TURNS = [0, 25, -25, 50, -50, 75, -75]

const COST = { along: 10, step: 1.2, wrongSide: 2.5, tip: 4, turn: 1 / 40, inside: 3, round: 3 }

/** The places right beside what a label names: none of them needs a leader. */
export function nearSpots(wish: Wish, size: Size): Spot[] {
  if (wish.arc) return aroundArc(wish.arc, size)
  const length = Math.hypot(wish.to.x - wish.from.x, wish.to.y - wish.from.y)
  return length < 1 ? aroundPoint(wish, size) : [...beside(wish, size), ...pastTip(wish, size)]
}

function beside(wish: Wish, size: Size): Spot[] {
  const direction = directionOf(wish)
  const spots: Spot[] = []
  for (const along of ALONG) {
    const point = pointAlong(wish, along)
    for (const side of [1, -1]) {
      const normal = { x: -direction.y * side, y: direction.x * side }
      for (const step of STEPS) {
        const cost =
          Math.abs(along - wish.along) * COST.along +
          step * COST.step +
          (wish.side === -side ? COST.wrongSide : 0)
        spots.push({ box: boxToward(point, normal, wish.reach + CLEAR + step, size), cost })
      }
    }
  }
  return spots
}

function pastTip(wish: Wish, size: Size): Spot[] {
  const direction = directionOf(wish)
  const base = wish.isBestAtTip ? 0 : COST.tip
  return STEPS.flatMap((step) =>
    TURNS.map((turn) => ({
      box: boxToward(wish.to, turned(direction, turn), CLEAR + step, size),
      cost: base + step * COST.step + Math.abs(turn) * COST.turn,
    })),
  )
}

function aroundPoint(wish: Wish, size: Size): Spot[] {
  const spots: Spot[] = []
  for (const step of STEPS) {
    for (let turn = 0; turn < 360; turn += 30) {
      const box = boxToward(wish.to, turned({ x: 1, y: 0 }, turn), wish.reach + CLEAR + step, size)
      spots.push({ box, cost: step * COST.step + (turn % 180 === 0 ? 0 : COST.round * 0.5) })
    }
  }
  return spots
}

function aroundArc({ centre, radius, sweep }: NonNullable<Wish['arc']>, size: Size): Spot[] {
  const spots: Spot[] = []
  for (const part of [0.5, 0.35, 0.65, 0.2, 0.8]) {
    const out = turned({ x: 1, y: 0 }, sweep * part)
    const point = { x: centre.x + out.x * radius, y: centre.y + out.y * radius }
    const cost = Math.abs(part - 0.5) * COST.along
    for (const step of STEPS) {
      spots.push({
        box: boxToward(point, out, CLEAR + step, size),
        cost: cost + step * COST.step,
      })
    }
    const inwards = { x: -out.x, y: -out.y }
    spots.push({ box: boxToward(point, inwards, CLEAR, size), cost: cost + COST.inside })
  }
  return spots
}

/** The point of a stretch at a share of its length. */
export function pointAlong({ from, to }: Wish, along: number): Place {
  return { x: from.x + (to.x - from.x) * along, y: from.y + (to.y - from.y) * along }
}

/** A unit vector along the stretch; to the right where it is a point. */
export function directionOf({ from, to }: Wish): Place {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  return length > 0 ? { x: (to.x - from.x) / length, y: (to.y - from.y) / length } : { x: 1, y: 0 }
}

/** A direction turned anticlockwise. */
export function turned({ x, y }: Place, degrees: number): Place {
  const [cosine, sine] = [cosDegrees(degrees), sinDegrees(degrees)]
  return { x: x * cosine - y * sine, y: x * sine + y * cosine }
}
