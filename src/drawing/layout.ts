import type { ComparisonEvaluation, Evaluation, Id, Sheet } from '../sheet'
import { drawingAreaOf } from './area'
import { type Box, boxOfPoints, joinBoxes, NO_BOX } from './geometry'
import { shownArrows } from './hand/arrows'
import { type ConstructionLines, constructionItems } from './hand/construction'
import { missesOf } from './hand/misses'
import { angleItem } from './items/angles'
import { addArrow } from './items/arrows'
import { axisItem } from './items/axis'
import { gapItem } from './items/gaps'
import { frameItem, gridItems, paperItem } from './items/paper'
import { createRegions, NO_REGIONS } from './items/regions'
import { createScaleBars } from './items/scale-bars'
import { createTitleBlock } from './items/title-block'
import { createLabels } from './labels'
import { createRegister } from './labels/register'
import { createOpenDrawing, NOTHING_OPEN, scalesWithOpen } from './open'
import { frameOf, paperSizeOf } from './paper'
import { createPicture, type Picture } from './picture'
import { type Frozen, type Placement, place } from './placement/place'
import { predictedItems } from './predicted/items'
import { NO_PREDICTION, placeBoth } from './predicted/place-both'
import { predictedWishes } from './predicted/wishes'
import type { Item, PlacedArrow, Scene } from './scene'
import { createSchematic, NO_SCHEMATIC } from './schematic'
import { createStamp, NO_STAMP } from './stamp'
import { describeDrawing } from './text/description'
import { type Palette, paletteOf, type Theme } from './theme'

/** How a sheet is laid out. */
export interface LayoutOptions {
  /** Light where nothing is said. */
  readonly theme?: Theme
  /** False leaves the labels out: they take most of the time. They are left out with `only`, too. */
  readonly labels?: boolean
  /** Keeps origin, scales and places as they are, as during a drag: pass the scene before it. */
  readonly frozen?: Frozen
  /** Makes items for the arrows of these keys alone; `arrows` still lists all. */
  readonly only?: ReadonlySet<string>
  /** The last whole evaluation, where this one has no verdict yet: its stamp is drawn in grey. */
  readonly former?: Evaluation
  /**
   * Places the figures of the arrows with these keys alone, and `arrows` lists no others: in a drag,
   * what stands still need not be looked at. Only with a whole scene as `frozen`.
   */
  readonly within?: ReadonlySet<string>
  /** Sums whose exact drawing is hidden, as while they are constructed by hand. */
  readonly hidden?: ReadonlySet<Id>
  /** The terminals of each phasor stand in its subscript (IEC 60375), where it has any. */
  readonly terminals?: boolean
  /** Leaves out what the circuit predicts, which is else drawn in thin broken lines under what was measured. */
  readonly withoutPrediction?: boolean
  /** The evaluation whose 95 % regions are drawn at the tips; none where nothing is said. */
  readonly regions?: Evaluation
  /** Lines of the construction to be drawn; none where nothing is said. */
  readonly construction?: ConstructionLines
  /** What the title block says of the sheet's number: `Sheet 1 of 3`. */
  readonly sheetNumber?: string
}

/**
 * Lays a sheet out on its paper, in millimetres: the same sheet and evaluation give the same scene.
 * What has no value yet is not drawn.
 */
export function layout(sheet: Sheet, evaluation: Evaluation, options: LayoutOptions = {}): Scene {
  const { theme = 'light', labels = true, frozen, only, within, hidden, construction } = options
  const { terminals = false } = options
  const palette = paletteOf(theme)
  const size = paperSizeOf(sheet.drawing)
  const frame = frameOf(size)
  const area = drawingAreaOf(sheet, frame)
  const { placement: placed, predicted } =
    only || within
      ? { placement: place(sheet, evaluation, area, frozen, within), predicted: NO_PREDICTION }
      : placeBoth(
          sheet,
          evaluation,
          comparedIn(evaluation, options),
          { area, frame, hidden },
          frozen,
        )
  const placement = {
    ...placed,
    unitsPerCentimetre: only
      ? placed.unitsPerCentimetre
      : scalesWithOpen(sheet, evaluation, placed.unitsPerCentimetre),
    arrows: shownArrows(sheet, placed.arrows, hidden),
  }
  const misses = missesOf(sheet, evaluation, hidden)
  const picture = createPicture(sheet, placement.arrows, misses)
  const items: Item[] = []
  const edges = only ? [] : addSheet(items, sheet, placement, picture, palette, options.sheetNumber)
  const open = only
    ? NOTHING_OPEN
    : createOpenDrawing(sheet, evaluation, placement, { frame, edges, hasLabels: labels }, palette)
  items.push(...open.arcs)
  const regions =
    only || options.regions === undefined
      ? NO_REGIONS
      : createRegions(placement.arrows, options.regions, placement.unitsPerCentimetre, frame, {
          palette,
          isFormer: evaluation.agreement === undefined,
        })
  const fences = [...edges, ...open.boxes, ...regions.boxes]
  if (construction) {
    const lines = constructionItems(sheet, evaluation, placement.arrows, construction, palette)
    for (const { key, item } of lines) if (!only || only.has(key)) items.push(item)
  }
  items.push(...predictedItems(predicted.arrows, palette))
  addDrawing(items, picture, palette, only)
  const schematic =
    only || !labels ? NO_SCHEMATIC : createSchematic(sheet, { items, frame, fences }, palette)
  items.push(...schematic.items)
  fences.push(...schematic.boxes)
  // Its figures would tell what is hidden.
  const stamp =
    only || hidden?.size
      ? NO_STAMP
      : createStamp(sheet, evaluation, options.former, { items, frame, fences }, palette)
  items.push(...stamp.items)
  const labelling =
    labels && !only
      ? createLabels(
          items,
          picture,
          createRegister(sheet, evaluation, terminals),
          frame,
          [...fences, ...stamp.boxes],
          palette,
          predictedWishes(sheet, predicted, palette),
        )
      : { items: [], leftOut: 0 }
  // Labels lie on the regions and take no notice of them: none moves when they are asked for.
  items.push(...regions.items, ...open.labels, ...labelling.items)
  return {
    ...size,
    ...placement,
    items,
    title: sheet.title,
    description: only ? '' : describeDrawing(sheet, evaluation, placement.unitsPerCentimetre),
    labelsLeftOut: labelling.leftOut + open.leftOut,
    ...(stamp.isLeftOut && { isStampLeftOut: true }),
    ...(predicted.leftOut > 0 && { predictedLeftOut: predicted.leftOut }),
    ...(schematic.isLeftOut && { isSchematicLeftOut: true }),
  }
}

/** What the circuit predicts: of the evaluation, or as long as it has none yet, of the one before. */
function comparedIn(
  { comparison }: Evaluation,
  { withoutPrediction, former }: LayoutOptions,
): readonly ComparisonEvaluation[] {
  return withoutPrediction ? [] : (comparison ?? former?.comparison ?? [])
}

/** Adds the paper and all that frames the drawing; gives the boxes that labels keep out of. */
function addSheet(
  items: Item[],
  sheet: Sheet,
  placement: Placement,
  picture: Picture,
  palette: Palette,
  sheetNumber: string | undefined,
): Box[] {
  const size = paperSizeOf(sheet.drawing)
  const frame = frameOf(size)
  const block = createTitleBlock(sheet, frame, palette, sheetNumber)
  const bars = createScaleBars(placement.unitsPerCentimetre, frame, palette)
  items.push(
    paperItem(size, palette),
    ...gridItems(frame, palette),
    frameItem(frame, palette),
    ...block.items,
    ...bars.items,
    ...axisItems(placement, picture, frame, palette),
  )
  return [block.box, ...bars.boxes]
}

/** Arcs, arrows and gaps, in painting order. */
function addDrawing(
  items: Item[],
  { arcs, painted, gaps, misses }: Picture,
  palette: Palette,
  only: ReadonlySet<string> | undefined,
): void {
  for (const arc of arcs) if (!only || only.has(arc.key)) items.push(angleItem(arc, palette))
  for (const arrow of painted) if (!only || only.has(arrow.key)) addArrow(items, arrow, palette)
  for (const gap of [...gaps, ...misses]) {
    if (!only || only.has(gap.key)) items.push(gapItem(gap, palette))
  }
}

/** The axis through the origin, and one through every other point about which an angle is drawn. */
function axisItems(
  { origin, arrows }: Placement,
  { arcs }: Picture,
  frame: Box,
  palette: Palette,
): Item[] {
  const centres = [origin, ...arcs.map(({ centre }) => centre)]
  const distinct = new Map(centres.map((centre) => [`${centre.x} ${centre.y}`, centre]))
  return [...distinct.values()].flatMap((centre) => {
    const item = axisItem(centre, reachFrom(arrows, centre), frame, palette)
    return item ? [item] : []
  })
}

/** How far the arrows that start at a point reach, with the figures that they belong to. */
function reachFrom(arrows: readonly PlacedArrow[], { x, y }: { x: number; y: number }): Box {
  const figures = new Set<string | undefined>()
  for (const { from, sum } of arrows) if (sum && from.x === x && from.y === y) figures.add(sum)
  return arrows.reduce((box, { from, to, sum }) => {
    const belongs = (sum !== undefined && figures.has(sum)) || (from.x === x && from.y === y)
    return belongs ? joinBoxes(box, boxOfPoints([from.x, from.y, to.x, to.y])) : box
  }, NO_BOX)
}
