import { type Item, layout, paletteOf, type Scene, type Theme } from '../../drawing'
import type { Sheet } from '../../sheet'
import { type Answer, answerOf, evaluationShown, type State } from '../store'

const groundParts: ReadonlySet<Item['part']> = new Set([
  'paper',
  'grid',
  'frame',
  'axis',
  'scale-bar',
  'title-block',
])

const scenes = new WeakMap<Answer, Map<string, Scene>>()

/** Whether an item belongs to the empty sheet, on which the arrows lie. */
export function isGround(item: Item): boolean {
  return groundParts.has(item.part)
}

/** The whole scene of a sheet in the colours of a theme, with all that is known of it by now, as read. */
export function drawnScene(sheet: Sheet, theme: Theme): Scene {
  return sceneOfAnswer(answerOf(sheet), theme, 'read')
}

/** The whole scene of an answer, as read or as adjusted; laid out once for each. */
export function sceneOfAnswer(answer: Answer, theme: Theme, values: State['values']): Scene {
  const own = scenes.get(answer) ?? new Map<string, Scene>()
  scenes.set(answer, own)
  const name = `${theme} ${values}`
  const known = own.get(name)
  if (known) return known
  const { sheet, former } = answer
  const evaluation = evaluationShown(answer, values)
  const scene = layout(sheet, evaluation, { theme, ...(former && { former }) })
  own.set(name, scene)
  return scene
}

/** An item in grey: what it says is of a sheet that is being changed. */
export function greyed(item: Item, theme: Theme): Item {
  const { thin } = paletteOf(theme)
  if (item.kind === 'text') return { ...item, fill: thin }
  return item.stroke === undefined ? item : { ...item, stroke: thin }
}
