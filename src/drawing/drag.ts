import {
  angleOf,
  cosDegrees,
  failure,
  type Result,
  sinDegrees,
  success,
  wrapDegrees,
} from '../core'
import { type Edit, type Evaluation, heldBy, type Place, type Sheet } from '../sheet'
import { measureOf, moveHandArrow, moveHandTip, tipOf } from './hand/redraw'
import type { PlacedArrow, Scene } from './scene'

/** What a drag of a tip comes to: the edit that it would make, and what the readout says. */
export interface TipDrag {
  readonly edit: Edit
  /** Length on the paper in millimetres. */
  readonly millimetres: number
  readonly magnitude: number
  readonly angle: number
}

/** Why a tip stays where it is: a whole sentence; undefined where it can be dragged. */
export function whyTipIsHeld(sheet: Sheet, arrow: PlacedArrow): string | undefined {
  if (arrow.hand !== undefined) return undefined
  if (arrow.phasor === undefined) {
    return 'The resultant is worked out from its terms: drag a term instead.'
  }
  const held = heldBy(sheet, arrow.phasor)
  return held.magnitude && held.angle ? held.why : undefined
}

/**
 * The edit that puts an arrow's tip at a point of the paper. The tip snaps to whole millimetres and
 * whole degrees; `free` takes tenths of both. A part that a reading holds, and the reference's angle,
 * stay as they are in the evaluation. Fails with a sentence where both parts are held.
 */
export function dragTip(
  sheet: Sheet,
  evaluation: Evaluation,
  scene: Scene,
  arrow: PlacedArrow,
  point: Place,
  free: boolean,
): Result<TipDrag> {
  const { phasor } = arrow
  if (arrow.hand !== undefined) return dragHandTip(sheet, scene, arrow, point)
  const why = whyTipIsHeld(sheet, arrow)
  if (why !== undefined || phasor === undefined) return failure(why ?? '')
  const held = heldBy(sheet, phasor)
  const known = evaluation.phasors.find(({ id }) => id === phasor)?.asRead ?? {}
  const perMillimetre = (scene.unitsPerCentimetre[arrow.quantity] ?? 1) / 10
  const aim = vectorOf(arrow, point)
  const angle = held.angle
    ? asGiven(known.angle ?? 0)
    : asSnapped(snapAngle(angleOf(aim), free).toFixed(free ? 1 : 0))
  const magnitude = held.magnitude
    ? asGiven(known.magnitude ?? 0)
    : asSnapped(
        (
          snapLength(reachOf(aim, held.angle ? angle.value : undefined), free) * perMillimetre
        ).toFixed(decimalsOfStep(perMillimetre, free)),
      )
  return success({
    edit: {
      kind: 'drag-tip',
      id: phasor,
      magnitude: magnitude.value,
      angle: angle.value,
      magnitudeText: magnitude.text,
      angleText: angle.text,
    },
    millimetres: magnitude.value / perMillimetre,
    magnitude: magnitude.value,
    angle: angle.value,
  })
}

/** What a hand drew goes to tenths of a millimetre and of a degree, as rule and protractor are read. */
function dragHandTip(
  sheet: Sheet,
  scene: Scene,
  arrow: PlacedArrow,
  point: Place,
): Result<TipDrag> {
  const drawn = sheet.hand?.find(({ id }) => id === arrow.hand)
  if (!drawn) return failure('This arrow was rubbed out.')
  const aim = measureOf(drawn.from, point)
  const millimetres = snapLength(aim.millimetres, true)
  const degrees = snapAngle(aim.degrees, true)
  const perMillimetre = (scene.unitsPerCentimetre[arrow.quantity] ?? 1) / 10
  return success({
    edit: moveHandTip(sheet, drawn, tipOf(drawn.from, { millimetres, degrees })),
    millimetres,
    magnitude: millimetres * perMillimetre,
    angle: arrow.sign === 1 ? degrees : wrapDegrees(degrees + 180),
  })
}

interface Figure {
  readonly value: number
  readonly text: string
}

function asGiven(value: number): Figure {
  return { value, text: String(value) }
}

function asSnapped(text: string): Figure {
  return { value: Number(text), text }
}

/** How long the arrow is to be: all the way to the aim, or along the angle that is held. */
function reachOf(aim: { re: number; im: number }, angle: number | undefined): number {
  if (angle === undefined) return Math.hypot(aim.re, aim.im)
  return Math.max(0, aim.re * cosDegrees(angle) + aim.im * sinDegrees(angle))
}

/**
 * The edit that moves what an arrow belongs to by a distance on the paper, to whole millimetres
 * (`free`: tenths): the whole figure of a sum, a loose phasor, or a hand arrow with what hangs on it.
 */
export function dragBody(
  sheet: Sheet,
  scene: Scene,
  arrow: PlacedArrow,
  by: Place,
  free: boolean,
): Edit | undefined {
  const step = free ? 10 : 1
  const snap = (value: number) => Math.round(value * step) / step
  const drawn = sheet.hand?.find(({ id }) => id === arrow.hand)
  if (drawn) return moveHandArrow(sheet, drawn, { x: snap(by.x), y: snap(by.y) })
  if (arrow.sum !== undefined) {
    const start = startOf(scene, arrow.sum)
    if (!start) return undefined
    return {
      kind: 'set-sum',
      id: arrow.sum,
      change: { start: { x: snap(start.x + by.x), y: snap(start.y + by.y) } },
    }
  }
  if (arrow.phasor === undefined || !sheet.phasors.some(({ id }) => id === arrow.phasor)) {
    return undefined
  }
  const tail = { x: snap(arrow.from.x + by.x), y: snap(arrow.from.y + by.y) }
  return { kind: 'place-phasor', id: arrow.phasor, tail }
}

/** Where a sum's figure starts on the paper. */
function startOf(scene: Scene, sum: string): Place | undefined {
  const first = scene.arrows.find(({ key }) => key === `resultant:${sum}`)
  return (first ?? scene.arrows.find((arrow) => arrow.sum === sum))?.from
}

function vectorOf(arrow: PlacedArrow, tip: Place): { re: number; im: number } {
  return {
    re: (tip.x - arrow.from.x) * arrow.sign,
    im: (tip.y - arrow.from.y) * arrow.sign,
  }
}

function snapAngle(degrees: number, free: boolean): number {
  const step = free ? 10 : 1
  return wrapDegrees(Math.round(degrees * step) / step)
}

function snapLength(millimetres: number, free: boolean): number {
  return free ? Math.round(millimetres * 10) / 10 : Math.round(millimetres)
}

/** Decimals that show one millimetre of paper (a tenth, where free) in the phasor's unit. */
export function decimalsOfStep(unitsPerMillimetre: number, free: boolean): number {
  const step = unitsPerMillimetre / (free ? 10 : 1)
  return Math.min(20, Math.max(0, -Math.floor(Math.log10(step) + 1e-9)))
}

/**
 * An edit together with the scene's origin and scales, written into the sheet, so that what is not
 * dragged stays where it is.
 */
export function pinDrawing(sheet: Sheet, scene: Scene, edit: Edit): Edit {
  const unitsPerCentimetre = {
    ...sheet.drawing?.unitsPerCentimetre,
    ...scene.unitsPerCentimetre,
  }
  return {
    kind: 'several',
    edits: [{ kind: 'set-drawing', drawing: { origin: scene.origin, unitsPerCentimetre } }, edit],
  }
}
