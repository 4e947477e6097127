import { cosDegrees, sinDegrees } from '../../core'
import type { Place } from '../../sheet'
import { boxToward, type Size, type Spot } from './spot'
import type { Wish } from './wish'

/** Which places are tried. */
interface Choice {
  /** Where along a stretch a label may stand, 0 at its tail. */
  readonly along: readonly number[]
  /** How far off it may stand without a leader, in millimetres. */
  readonly steps: readonly number[]
  /** Directions past the tip, from the arrow's own. */
  readonly turns: readonly number[]
}

const ALL: Choice = {
  along: [0.5, 0.4, 0.6, 0.3, 0.7, 0.8, 0.2, 0.9, 0.1, 1, 0],
  steps: [0, 1.6, 3.4],
  turns: [0, 25, -25, 50, -50, 75, -75],
}
const FEW: Choice = { along: [0.5, 0.75, 0.25], steps: [0], turns: [0, 50, -50] }

/** What stays free between a label and what it names, in millimetres. */
const CLEAR = 1.3
const COST = { along: 10, step: 1.2, wrongSide: 2.5, tip: 4, turn: 1 / 40, inside: 3, round: 1.5 }

/** The places right beside what a label names, none of which needs a leader; `isMany` gives a few. */
export function nearSpots(wish: Wish, size: Size, isMany = false): Spot[] {
  const choice = isMany ? FEW : ALL
  if (wish.arc) return aroundArc(wish.arc, size, choice)
  const length = Math.hypot(wish.to.x - wish.from.x, wish.to.y - wish.from.y)
  return length < 1
    ? aroundPoint(wish, size, choice)
    : [...beside(wish, size, choice), ...pastTip(wish, size, choice)]
}

function beside(wish: Wish, size: Size, choice: Choice): Spot[] {
  const direction = directionOf(wish)
  const spots: Spot[] = []
  for (const along of choice.along) {
    const point = pointAlong(wish, along)
    for (const side of [1, -1]) {
      const normal = { x: -direction.y * side, y: direction.x * side }
      for (const step of choice.steps) {
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

function pastTip(wish: Wish, size: Size, { steps, turns }: Choice): Spot[] {
  const direction = directionOf(wish)
  const base = wish.isBestAtTip ? 0 : COST.tip
  return steps.flatMap((step) =>
    turns.map((turn) => ({
      box: boxToward(wish.to, turned(direction, turn), CLEAR + step, size),
      cost: base + step * COST.step + Math.abs(turn) * COST.turn,
    })),
  )
}

function aroundPoint(wish: Wish, size: Size, { steps }: Choice): Spot[] {
  const spots: Spot[] = []
  for (const step of steps) {
    for (let turn = 0; turn < 360; turn += 30) {
      const box = boxToward(wish.to, turned({ x: 1, y: 0 }, turn), wish.reach + CLEAR + step, size)
      spots.push({ box, cost: step * COST.step + (turn % 180 === 0 ? 0 : COST.round) })
    }
  }
  return spots
}

function aroundArc(
  { centre, radius, sweep }: NonNullable<Wish['arc']>,
  size: Size,
  { steps }: Choice,
): Spot[] {
  const spots: Spot[] = []
  for (const part of [0.5, 0.35, 0.65, 0.2, 0.8]) {
    const out = turned({ x: 1, y: 0 }, sweep * part)
    const point = { x: centre.x + out.x * radius, y: centre.y + out.y * radius }
    const cost = Math.abs(part - 0.5) * COST.along
    for (const step of steps) {
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
