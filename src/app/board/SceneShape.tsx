import type { Context } from 'konva/lib/Context'
import type { Shape as KonvaShape } from 'konva/lib/Shape'
import { type Ref, useCallback } from 'react'
import { Shape } from 'react-konva/lib/ReactKonvaCore'
import type { Item } from '../../drawing'
import { paintItems } from './paint'
import type { View } from './view'

/** Items of a scene as one Konva shape, painted straight on its canvas: one shape, however many items. */
export function SceneShape(properties: {
  readonly items: readonly Item[]
  readonly view: View
  /** The paper's height in millimetres. */
  readonly height: number
  readonly shape?: Ref<KonvaShape>
}) {
  const { items, view, height, shape } = properties
  const paint = useCallback(
    (context: Context) => paintItems(context._context, items, height),
    [items, height],
  )
  return (
    <Shape
      ref={shape ?? null}
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
