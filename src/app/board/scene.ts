import {
  type ConstructionLines,
  type Item,
  layout,
  type PlacedArrow,
  paletteOf,
  type Scene,
  type Theme,
} from '../../drawing'
import type { Id, Sheet } from '../../sheet'
import { type Answer, answerOf, evaluationShown, formerPhasors, type State } from '../store'

const groundParts: ReadonlySet<Item['part']> = new Set([
  'paper',
  'grid',
  'frame',
  'axis',
  'scale-bar',
  'title-block',
])

const none: ReadonlySet<string> = new Set()
const scenes = new WeakMap<Answer, Map<string, Scene>>()

/** What of a scene is a matter of the view: no sheet says it. */
export interface ViewOptions {
  /** Sums whose exact drawing is hidden. */
  readonly hidden?: ReadonlySet<Id>
  readonly construction?: ConstructionLines
  /** As read where nothing is said. */
  readonly values?: State['values']
  /** The terminals of each phasor stand in its subscript. */
  readonly terminals?: boolean
  /** What the circuit predicts is left out. */
  readonly withoutPrediction?: boolean
  /** The 95 % regions of the best values are drawn at the tips. */
  readonly areRegionsShown?: boolean
}

/** Whether an item belongs to the empty sheet, on which the arrows lie. */
export function isGround(item: Item): boolean {
  return groundParts.has(item.part)
}

/** The whole scene of a sheet in the colours of a theme, with all that is known of it by now. */
export function drawnScene(sheet: Sheet, theme: Theme, options: ViewOptions = {}): Scene {
  return sceneOfAnswer(answerOf(sheet), theme, options)
}

/** The whole scene of an answer; laid out once for each view. */
export function sceneOfAnswer(answer: Answer, theme: Theme, options: ViewOptions): Scene {
  const { values = 'read', areRegionsShown = false, ...view } = options
  const { hidden = [], terminals = false, construction = {}, withoutPrediction = false } = view
  const { parallels = false, arcs = false } = construction
  const switches = [areRegionsShown, terminals, parallels, arcs, withoutPrediction]
  const name = [theme, values, ...switches, ...hidden].join(' ')
  const own = scenes.get(answer) ?? new Map<string, Scene>()
  scenes.set(answer, own)
  const known = own.get(name)
  if (known) return known
  const { sheet, whole, former } = answer
  const regions = areRegionsShown ? (whole ?? former) : undefined
  const evaluation = evaluationShown(answer, values)
  const scene = layout(sheet, evaluation, {
    theme,
    ...view,
    ...(former && { former }),
    ...(regions && { regions }),
  })
  const shown = withFormerGreyed(scene, answer, values, theme)
  own.set(name, shown)
  return shown
}

/** A scene in which whatever hangs on values of the sheet before is grey. */
function withFormerGreyed(
  scene: Scene,
  answer: Answer,
  values: State['values'],
  theme: Theme,
): Scene {
  const keys = formerArrows(scene.arrows, answer, values)
  return keys.size === 0 ? scene : { ...scene, items: greyedOf(scene.items, keys, theme) }
}

/** The keys of the arrows, and of sums with one of them among their terms, that show a former value. */
export function formerArrows(
  arrows: readonly PlacedArrow[],
  answer: Answer,
  values: State['values'] = 'read',
): ReadonlySet<string> {
  const phasors = formerPhasors(answer, values)
  if (phasors.size === 0) return none
  const isFormer = (id: Id | undefined) => id !== undefined && phasors.has(id)
  const sums = new Set(
    (answer.sheet.sums ?? []).flatMap(({ id, terms }) =>
      terms.some(({ phasor }) => isFormer(phasor)) ? [id] : [],
    ),
  )
  return new Set(
    arrows.flatMap(({ key, role, phasor, sum }) =>
      isFormer(phasor) || (role === 'resultant' && sum !== undefined && sums.has(sum)) ? [key] : [],
    ),
  )
}

/** The items, those of some arrows in grey. */
export function greyedOf(
  items: readonly Item[],
  keys: ReadonlySet<string>,
  theme: Theme,
): readonly Item[] {
  return items.map((item) =>
    item.arrow !== undefined && keys.has(item.arrow) ? greyed(item, theme) : item,
  )
}

/** An item in grey: what it says is of a sheet that is being changed. */
export function greyed(item: Item, theme: Theme): Item {
  const { thin } = paletteOf(theme)
  if (item.kind === 'text') return { ...item, fill: thin }
  return {
    ...item,
    ...(item.stroke !== undefined && { stroke: thin }),
    ...('fill' in item && item.fill !== undefined && { fill: thin }),
  }
}
