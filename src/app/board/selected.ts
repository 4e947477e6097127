import type { PlacedArrow, Scene } from '../../drawing'
import type { Selection } from '../store'

/** The arrow that keys move: the hand arrow that is picked, or where the phasor that is picked lies. */
export function selectedArrow(scene: Scene, selection: Selection): PlacedArrow | undefined {
  const { kind, id } = selection
  if (kind === 'hand') return scene.arrows.find(({ hand }) => hand === id)
  return kind === 'phasor' ? scene.arrows.find(({ phasor }) => phasor === id) : undefined
}
