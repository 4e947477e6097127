import { angleOf, magnitudeOf, radiansFromDegrees } from '../../core'
import type { Place } from '../../sheet'
import type { Scales } from './extent'
import type { Figure, Member } from './figure'

/** A tip that is nearer than this to another arrow makes the two look like one. */
const ALONG_MILLIMETRES = 2
/** A step on the grid, with room for a line of text between. */
const WIDEST_STEP = 10
const NARROWEST_STEP = 2.5
/** How far the last of many may be set off. */
const FURTHEST = 80
const MOST_STEPS = FURTHEST / NARROWEST_STEP
const SECTOR_DEGREES = 3
const SECTORS = 360 / SECTOR_DEGREES

/** An arrow from the origin, by how many steps it is set off. */
interface Ray {
  readonly angle: number
  readonly length: number
  readonly steps: number
}

/**
 * Where loose figures start, away from the origin, that would lie along another arrow from it: set
 * off at right angles, to the lower side, a step for each. `figures` all start at the origin.
 */
export function setOffs(figures: readonly Figure[], scales: Scales): Map<string, Place> {
  const rays: Ray[][] = Array.from({ length: SECTORS }, () => [])
  for (const { isSum, members } of figures) {
    if (!isSum) continue
    for (const member of members) if (member.after < 0) keep(rays, rayOf(member, scales))
  }
  const moved = new Map<string, Ray>()
  for (const { isSum, members, key } of figures) {
    const [first] = members
    if (isSum || !first) continue
    const ray = rayOf(first, scales)
    // So short an arrow hides nothing, wherever it lies.
    if (ray.length < ALONG_MILLIMETRES) continue
    const steps = freeStep(rays, ray)
    if (steps === undefined) continue
    keep(rays, { ...ray, steps })
    if (steps > 0) moved.set(key, { ...ray, steps })
  }
  const starts = new Map<string, Place>()
  for (const [key, ray] of moved) starts.set(key, below(ray.angle, ray.steps * stepOf(rays, ray)))
  return starts
}

function rayOf({ vector, quantity }: Member, scales: Scales): Ray {
  const length = (magnitudeOf(vector) * 10) / (scales.get(quantity) ?? 1)
  return { angle: angleOf(vector), length, steps: 0 }
}

function keep(rays: Ray[][], ray: Ray): void {
  rays[sectorOf(ray.angle)]?.push(ray)
}

/** The first step that no arrow along the ray has taken; undefined where all are taken. */
function freeStep(rays: Ray[][], ray: Ray): number | undefined {
  const taken = new Set<number>()
  for (const other of near(rays, ray)) if (isAlong(ray, other)) taken.add(other.steps)
  for (let steps = 0; steps <= MOST_STEPS; steps += 1) if (!taken.has(steps)) return steps
  return undefined
}

function isAlong(ray: Ray, other: Ray): boolean {
  const turn = Math.abs(ray.angle - other.angle)
  const between = Math.min(turn, 360 - turn)
  const apart = Math.min(ray.length, other.length) * Math.sin(radiansFromDegrees(between))
  return between <= SECTOR_DEGREES && apart < ALONG_MILLIMETRES
}

/** How wide a step is: narrower where many are set off in about one direction. */
function stepOf(rays: Ray[][], ray: Ray): number {
  const most = near(rays, ray).reduce((deepest, { steps }) => Math.max(deepest, steps), 1)
  return Math.max(NARROWEST_STEP, Math.min(WIDEST_STEP, FURTHEST / most))
}

/** The rays of about the same direction. */
function near(rays: Ray[][], { angle }: Ray): Ray[] {
  const sector = sectorOf(angle)
  return [sector - 1, sector, sector + 1].flatMap(
    (neighbour) => rays[(neighbour + SECTORS) % SECTORS] ?? [],
  )
}

function sectorOf(angle: number): number {
  return ((Math.floor(angle / SECTOR_DEGREES) % SECTORS) + SECTORS) % SECTORS
}

/** A step at right angles to a direction: downwards, and to the right of an upright one. */
function below(angle: number, distance: number): Place {
  const radians = radiansFromDegrees(angle)
  const [x, y] = [Math.sin(radians), -Math.cos(radians)]
  const isBelow = Math.abs(y) > 1e-9 ? y < 0 : x > 0
  return { x: (isBelow ? x : -x) * distance, y: (isBelow ? y : -y) * distance }
}
