import { type LayoutOptions, layout, type PlacedArrow, type Scene } from '../../../src/drawing'
import { quick, type Sheet } from '../../../src/sheet'

/** A sheet as it is evaluated and laid out, without labels where nothing is said. */
export function sceneOf(sheet: Sheet, options: LayoutOptions = { labels: false }): Scene {
  return layout(sheet, quick(sheet), options)
}

/** The arrow of a key; fails where there is none. */
export function arrowOf(scene: Scene, key: string): PlacedArrow {
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}.`)
  return arrow
}

/** The length of an arrow on the paper, in millimetres. */
export function lengthOf({ from, to }: PlacedArrow): number {
  return Math.hypot(to.x - from.x, to.y - from.y)
}
