import { failure, type Result, success, wrapDegrees } from '../../core'
import { type Edit, type Id, newId, type Phasor, type Quantity, type Sheet } from '../../sheet'
import { decimalsOfStep, pinDrawing } from '../drag'
import type { Scene } from '../scene'
import type { Stroke } from './snap'
import { handArrowAt, type Position, standsAt } from './typed'

/** What a stroke turned out to be: an arrow of a sum's construction, or a new phasor. */
export type Meaning =
  | { readonly kind: 'hand'; readonly sum: Id; readonly position: Position }
  | {
      readonly kind: 'phasor'
      readonly label: string
      readonly quantity: Quantity
      /** The sum that it becomes the last term of. */
      readonly sum?: Id
    }

/**
 * The edit that makes a stroke what it is meant to be, in one step with the scale and the origin, which
 * stay from then on. Fails with a sentence where nothing says what a millimetre stands for.
 */
export function placeStroke(
  sheet: Sheet,
  scene: Scene,
  stroke: Stroke,
  meaning: Meaning,
): Result<Edit> {
  return meaning.kind === 'hand'
    ? placeHand(sheet, scene, stroke, meaning)
    : placePhasor(sheet, scene, stroke, meaning)
}

function placeHand(
  sheet: Sheet,
  scene: Scene,
  { tail, tip }: Stroke,
  { sum, position }: Extract<Meaning, { kind: 'hand' }>,
): Result<Edit> {
  const stands = standsAt(sheet, sum, position)
  if (stands === undefined) return failure('That term is no longer in the sum: choose another.')
  if (!hasScale(sheet, scene, sum)) return failure(NO_SCALE)
  const id = handArrowAt(sheet, sum, position)?.id ?? newId(sheet, 'h1')
  const edit: Edit = { kind: 'set-hand-arrow', id, sum, stands, from: tail.at, to: tip }
  return success(pinDrawing(sheet, scene, edit))
}

/** What is said where a construction has no scale. */
export const NO_SCALE =
  'Nothing says yet what a millimetre stands for: type the scale under “Drawn by hand”.'

/** Whether the drawing has a scale for the quantity that a sum adds. */
export function hasScale(sheet: Sheet, scene: Scene, sum: Id): boolean {
  const first = sheet.sums?.find(({ id }) => id === sum)?.terms[0]?.phasor
  const quantity = sheet.phasors.find(({ id }) => id === first)?.quantity
  if (quantity === undefined) return false
  const scale = scene.unitsPerCentimetre[quantity] ?? sheet.drawing?.unitsPerCentimetre?.[quantity]
  return scale !== undefined
}

/** The value of a stroke in a quantity, by the scale of the scene; 1 unit to 10 mm where it has none. */
export function valueOfStroke(
  scene: Scene,
  { millimetres, degrees }: Stroke,
  quantity: Quantity,
): { readonly magnitude: number; readonly angle: number; readonly text: string } {
  const perMillimetre = (scene.unitsPerCentimetre[quantity] ?? 1) / 10
  const isFine = !Number.isInteger(millimetres)
  const text = (millimetres * perMillimetre).toFixed(decimalsOfStep(perMillimetre, isFine))
  return { magnitude: Number(text), angle: degrees, text }
}

function placePhasor(
  sheet: Sheet,
  scene: Scene,
  stroke: Stroke,
  { label, quantity, sum }: Extract<Meaning, { kind: 'phasor' }>,
): Result<Edit> {
  const name = label.trim()
  if (name === '') return failure('A phasor needs a label: type one such as V1.')
  const { magnitude, angle, text } = valueOfStroke(scene, stroke, quantity)
  const { tail } = stroke
  const phasor: Phasor = {
    id: newId(sheet, name),
    label: name,
    quantity,
    magnitude: { value: magnitude, text },
    angle: { value: wrapDegrees(angle), text: String(wrapDegrees(angle)) },
    ...(sum === undefined && {
      tail: tail.tipOf === undefined ? tail.at : { tipOf: tail.tipOf },
    }),
  }
  const scaled = {
    ...scene,
    unitsPerCentimetre: { [quantity]: 1, ...scene.unitsPerCentimetre },
  }
  const edit: Edit = { kind: 'add-phasor', phasor, ...(sum !== undefined && { term: { sum } }) }
  return success(pinDrawing(sheet, scaled, edit))
}
