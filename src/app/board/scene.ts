import { type Item, layout, type Scene, type Theme } from '../../drawing'
import type { Sheet } from '../../sheet'
import { answerOf } from '../store'

const groundParts: ReadonlySet<Item['part']> = new Set([
  'paper',
  'grid',
  'frame',
  'axis',
  'scale-bar',
  'title-block',
])

const scenes = {
  light: new WeakMap<Sheet, Scene>(),
  dark: new WeakMap<Sheet, Scene>(),
}

/** Whether an item belongs to the empty sheet, on which the arrows lie. */
export function isGround(item: Item): boolean {
  return groundParts.has(item.part)
}

/** The whole scene of a sheet in the colours of a theme; laid out once for each sheet. */
export function drawnScene(sheet: Sheet, theme: Theme): Scene {
  const known = scenes[theme].get(sheet)
  if (known) return known
  const scene = layout(sheet, answerOf(sheet).evaluation, { theme })
  scenes[theme].set(sheet, scene)
  return scene
}
