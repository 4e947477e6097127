import type { Context } from 'konva/lib/Context'
import { useCallback } from 'react'
import { Shape } from 'react-konva/lib/ReactKonvaCore'
import { paletteOf, type Scene, type Theme } from '../../drawing'
import type { Selection } from '../store'
import type { View } from './view'

const breadth = 3.2

/** A broad soft stroke over the arrows that are picked, clear enough to see them through it. */
export function SelectionShape(properties: {
  readonly scene: Scene
  readonly selection: Selection | undefined
  readonly theme: Theme
  readonly view: View
}) {
  const { scene, selection, theme, view } = properties
  const paint = useCallback(
    ({ _context: pen }: Context) => {
      pen.lineWidth = breadth
      pen.lineCap = 'round'
      pen.strokeStyle = paletteOf(theme).selection
      for (const arrow of scene.arrows) {
        const picked =
          selection?.kind === 'phasor'
            ? arrow.phasor === selection.id
            : selection?.kind === 'hand'
              ? arrow.hand === selection.id
              : selection !== undefined && arrow.sum === selection.id
        if (!picked) continue
        pen.beginPath()
        pen.moveTo(arrow.from.x, scene.height - arrow.from.y)
        pen.lineTo(arrow.to.x, scene.height - arrow.to.y)
        pen.stroke()
      }
    },
    [scene, selection, theme],
  )
  return (
    <Shape
      x={view.x}
      y={view.y}
      scaleX={view.scale}
      scaleY={view.scale}
      sceneFunc={paint}
      listening={false}
      perfectDrawEnabled={false}
    />
  )
}
