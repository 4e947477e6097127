import { type ConstructionLines, type Item, layout, type Scene, type Theme } from '../../drawing'
import type { Id, Sheet } from '../../sheet'
import { answerOf } from '../store'

const groundParts: ReadonlySet<Item['part']> = new Set([
  'paper',
  'grid',
  'frame',
  'axis',
  'scale-bar',
  'title-block',
])

const scenes = new WeakMap<Sheet, Map<string, Scene>>()

/** What of a scene is a matter of the view: no sheet says it. */
export interface ViewOptions {
  /** Sums whose exact drawing is hidden. */
  readonly hidden?: ReadonlySet<Id>
  readonly construction?: ConstructionLines
  /** The terminals of each phasor stand in its subscript. */
  readonly terminals?: boolean
}

/** Whether an item belongs to the empty sheet, on which the arrows lie. */
export function isGround(item: Item): boolean {
  return groundParts.has(item.part)
}

/** The whole scene of a sheet in the colours of a theme; laid out once for each sheet and view. */
export function drawnScene(sheet: Sheet, theme: Theme, options: ViewOptions = {}): Scene {
  const { hidden = [], terminals = false, construction = {} } = options
  const { parallels = false, arcs = false } = construction
  const name = [theme, terminals, parallels, arcs, ...hidden].join(' ')
  const own = scenes.get(sheet) ?? new Map<string, Scene>()
  scenes.set(sheet, own)
  const known = own.get(name)
  if (known) return known
  const scene = layout(sheet, answerOf(sheet).evaluation, { theme, ...options })
  own.set(name, scene)
  return scene
}
