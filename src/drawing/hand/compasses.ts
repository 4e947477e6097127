import { angleOf, wrapDegrees } from '../../core'
import type { Evaluation, Id, Place, Sheet, Sum } from '../../sheet'
import type { PlacedArrow } from '../scene'

/** A short arc that the compasses draw about a point. */
export interface Swing {
  readonly centre: Place
  readonly radius: number
  /** Degrees, anticlockwise from the x axis. */
  readonly start: number
  readonly sweep: number
}

/** How far an arc reaches to either side of the corner, in millimetres and at most in degrees. */
const REACH = 7
const MOST_DEGREES = 30
/** More corners than this are a thicket. */
const MOST_CORNERS = 11

interface Circle {
  readonly centre: Place
  readonly radius: number
}

/**
 * The arcs with which two known lengths find a corner. Where both sides of a corner are drawn, they
 * cross at that corner. In a sum of two terms and what they must equal, one side that is drawn is
 * enough, with the sizes of the other two: then both corners are shown at which they fit.
 */
export function compassesOf(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  own: readonly PlacedArrow[],
  terms: readonly PlacedArrow[],
): Swing[] {
  if (sum.arrangement === 'from-origin') return []
  if (terms.length === sum.terms.length) return drawnCorners(terms)
  return soughtCorners(sheet, evaluation, sum, own, terms)
}

function drawnCorners(terms: readonly PlacedArrow[]): Swing[] {
  if (terms.length > MOST_CORNERS + 1) return []
  return terms.slice(1).flatMap((next, index) => {
    const before = terms[index] as PlacedArrow
    const one = { centre: before.from, radius: lengthBetween(before.from, before.to) }
    const other = { centre: next.to, radius: lengthBetween(next.from, next.to) }
    return [swingAbout(one, before.to), swingAbout(other, before.to)].flatMap(
      (swing) => swing ?? [],
    )
  })
}

function soughtCorners(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  own: readonly PlacedArrow[],
  terms: readonly PlacedArrow[],
): Swing[] {
  const [first, second] = sum.terms
  if (!first || !second || sum.terms.length > 2 || typeof sum.equals !== 'string') return []
  const end = own.find(({ role }) => role === 'measured')
  const [side] = terms
  const quantity = (side ?? end)?.quantity
  const scale = quantity && sheet.drawing?.unitsPerCentimetre?.[quantity]
  const millimetres = (id: Id): number | undefined => {
    const size = evaluation.phasors.find((phasor) => phasor.id === id)?.magnitude
    return size === undefined || scale === undefined ? undefined : (size * 10) / scale
  }
  // Of the triangle's sides, one lies on the paper: its ends are where the compasses are set.
  const base = side?.phasor === first.phasor ? side : terms.length === 0 ? end : undefined
  if (!base) return []
  const aboutTail = millimetres(base === end ? first.phasor : sum.equals)
  const aboutTip = millimetres(second.phasor)
  if (!aboutTail || !aboutTip) return []
  const circles = [
    { centre: base.from, radius: aboutTail },
    { centre: base.to, radius: aboutTip },
  ] as const
  return crossings(...circles).flatMap((corner) =>
    circles.flatMap((circle) => swingAbout(circle, corner) ?? []),
  )
}

/** Where two circles cross: two points, or none where they do not reach each other. */
export function crossings(one: Circle, other: Circle): readonly Place[] {
  const across = { x: other.centre.x - one.centre.x, y: other.centre.y - one.centre.y }
  const apart = Math.hypot(across.x, across.y)
  if (apart === 0) return []
  const along =
    (apart * apart + one.radius * one.radius - other.radius * other.radius) / (2 * apart)
  const squared = one.radius * one.radius - along * along
  if (!(squared >= 0)) return []
  const aside = Math.sqrt(squared)
  const [x, y] = [across.x / apart, across.y / apart]
  return [1, -1].map((side) => ({
    x: one.centre.x + x * along - y * aside * side,
    y: one.centre.y + y * along + x * aside * side,
  }))
}

function swingAbout({ centre, radius }: Circle, corner: Place): Swing | undefined {
  if (!(radius > 0)) return undefined
  const middle = angleOf({ re: corner.x - centre.x, im: corner.y - centre.y })
  const half = Math.min(MOST_DEGREES, (REACH / radius) * (180 / Math.PI))
  return { centre, radius, start: wrapDegrees(middle - half), sweep: 2 * half }
}

function lengthBetween(one: Place, other: Place): number {
  return Math.hypot(one.x - other.x, one.y - other.y)
}
