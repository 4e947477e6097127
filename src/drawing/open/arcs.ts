import { niceScale } from '../../core'
import type {
  Evaluation,
  Id,
  Phasor,
  Place,
  Quantity,
  Sheet,
  UnitsPerCentimetre,
} from '../../sheet'
import { type Box, growBox } from '../geometry'
import type { Placement } from '../placement/place'
import type { PlacedArrow } from '../scene'

/** Where the tip of a phasor may lie whose magnitude is known and whose angle is not. */
export interface OpenArc {
  readonly phasor: Phasor
  /** In the unit of its quantity. */
  readonly magnitude: number
  /** Where its tail lies. */
  readonly centre: Place
  /** Its magnitude by the scale, in millimetres. */
  readonly radius: number
  /** The stretches of the circle that are drawn: degrees, anticlockwise. */
  readonly stretches: readonly Stretch[]
}

/** A stretch of a circle. */
export interface Stretch {
  readonly start: number
  readonly sweep: number
}

/** Where there is room for arcs: inside the frame, and off the boxes at its edges. */
export interface PaperRoom {
  readonly frame: Box
  readonly edges: readonly Box[]
}

/** Half of what is drawn about a direction that is likely, in degrees. */
const ABOUT_LIKELY = 30
/** How fine a circle is followed to find what of it lies on the paper, in degrees. */
const STEP = 2
/** What of the paper inside the frame is kept free, in millimetres. */
const MARGIN = 3
/** A shorter radius is a speck, in millimetres. */
const SMALLEST_RADIUS = 2
/** How long the longest radius of a quantity is that has no scale yet, in centimetres. */
const LENGTH_WITHOUT_SCALE = 5

/** The scales of a drawing, and one for each quantity of which only such phasors are known. */
export function scalesWithOpen(
  sheet: Sheet,
  evaluation: Evaluation,
  known: UnitsPerCentimetre,
): UnitsPerCentimetre {
  const open = openPhasors(sheet, evaluation)
  const scales: { [quantity in Quantity]?: number } = { ...known }
  for (const { phasor } of open) {
    const { quantity } = phasor
    if (scales[quantity] !== undefined) continue
    const sizes = open.filter((each) => each.phasor.quantity === quantity)
    const largest = Math.max(...sizes.map(({ magnitude }) => magnitude))
    const stated = sheet.drawing?.unitsPerCentimetre?.[quantity]
    scales[quantity] = stated ?? niceScale(largest, LENGTH_WITHOUT_SCALE)
  }
  return open.length === 0 ? known : scales
}

/**
 * The circles on which the tips lie of phasors whose magnitude is known and whose angle is open, each
 * about its tail: what of them is on the paper. Of a phasor that a sum must equal, and whose resultant
 * is drawn, only the stretch about the resultant's direction is: there the two are compared.
 */
export function openArcsOf(
  sheet: Sheet,
  evaluation: Evaluation,
  placement: Placement,
  { frame, edges }: PaperRoom,
): readonly OpenArc[] {
  const room = {
    frame: growBox(frame, -MARGIN),
    edges: edges.map((box) => growBox(box, MARGIN / 2)),
  }
  return openPhasors(sheet, evaluation).flatMap(({ phasor, magnitude }) => {
    const scale = placement.unitsPerCentimetre[phasor.quantity]
    if (scale === undefined) return []
    const radius = (magnitude * 10) / scale
    if (!(radius >= SMALLEST_RADIUS) || !Number.isFinite(radius)) return []
    return seatsOf(sheet, phasor, placement).flatMap(({ centre, likely }) => {
      const stretches = stretchesInside(centre, radius, room, likely)
      return stretches.length === 0 ? [] : [{ phasor, magnitude, centre, radius, stretches }]
    })
  })
}

function openPhasors(
  sheet: Sheet,
  evaluation: Evaluation,
): readonly { readonly phasor: Phasor; readonly magnitude: number }[] {
  return evaluation.phasors.flatMap(({ asRead, magnitude: solved, angle }, index) => {
    const phasor = sheet.phasors[index]
    const magnitude = asRead.magnitude ?? solved
    const isOpen = asRead.angle === undefined && angle === undefined
    return phasor !== undefined && magnitude !== undefined && magnitude > 0 && isOpen
      ? [{ phasor, magnitude }]
      : []
  })
}

interface Seat {
  readonly centre: Place
  /** The direction in which the tip is looked for, in degrees. */
  readonly likely?: number
}

/** Where the tails of a phasor lie: in each sum that names it, else where it is placed by itself. */
function seatsOf(sheet: Sheet, { id, tail }: Phasor, placement: Placement): readonly Seat[] {
  const arrows = new Map(placement.arrows.map((arrow) => [arrow.key, arrow]))
  const seats = (sheet.sums ?? []).flatMap((sum): readonly Seat[] => {
    const start = sum.start ?? placement.starts.get(`sum:${sum.id}`) ?? placement.origin
    if (sum.equals === id) {
      const resultant = arrows.get(`resultant:${sum.id}`)
      return [{ centre: start, ...(resultant && { likely: directionOf(resultant) }) }]
    }
    const at = sum.terms.findIndex(({ phasor }) => phasor === id)
    if (at < 0) return []
    if (sum.arrangement === 'from-origin') return [{ centre: start }]
    const before = sum.terms
      .slice(0, at)
      .flatMap((_, position) => arrows.get(`term:${sum.id}:${position}`) ?? [])
    return [{ centre: before.at(-1)?.to ?? start }]
  })
  if (seats.length > 0) return seats
  if (tail === undefined) return [{ centre: placement.origin }]
  return [
    { centre: 'x' in tail ? tail : (tipOf(placement.arrows, tail.tipOf) ?? placement.origin) },
  ]
}

function tipOf(arrows: readonly PlacedArrow[], id: Id): Place | undefined {
  return arrows.find(({ phasor }) => phasor === id)?.to
}

function directionOf({ from, to }: PlacedArrow): number {
  return (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
}

/** The stretches of a circle that lie inside the frame, clear of the title block and the scale bars. */
function stretchesInside(
  centre: Place,
  radius: number,
  room: PaperRoom,
  likely: number | undefined,
): readonly Stretch[] {
  const start = likely === undefined ? 0 : likely - ABOUT_LIKELY
  const whole = likely === undefined ? 360 : 2 * ABOUT_LIKELY
  const stretches: Stretch[] = []
  let open: number | undefined
  for (let turn = 0; turn <= whole; turn += STEP) {
    const isIn = isFree(pointOn(centre, radius, start + turn), room)
    if (isIn) open ??= turn
    if (open === undefined || (isIn && turn < whole)) continue
    const end = isIn ? turn : turn - STEP
    if (end > open) stretches.push({ start: start + open, sweep: end - open })
    open = undefined
  }
  return stretches
}

/** A point of a circle, at an angle in degrees. */
export function pointOn({ x, y }: Place, radius: number, degrees: number): Place {
  const radians = (degrees * Math.PI) / 180
  return { x: x + radius * Math.cos(radians), y: y + radius * Math.sin(radians) }
}

function isFree(point: Place, { frame, edges }: PaperRoom): boolean {
  return isOn(point, frame) && !edges.some((box) => isOn(point, box))
}

function isOn({ x, y }: Place, box: Box): boolean {
  return x >= box.left && x <= box.right && y >= box.bottom && y <= box.top
}
