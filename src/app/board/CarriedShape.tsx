import type { Shape as KonvaShape } from 'konva/lib/Shape'
import { useLayoutEffect, useRef } from 'react'
import { boundsOfAll, type Item } from '../../drawing'
import type { Place } from '../../sheet'
import { SceneShape } from './SceneShape'
import type { Size, View } from './view'

const border = 2

/**
 * What hangs on a tip that is being dragged: painted once into a picture of its own, which each
 * frame only moves.
 */
export function CarriedShape(properties: {
  readonly items: readonly Item[]
  readonly view: View
  readonly size: Size
  readonly height: number
  /** How far it has been carried, in millimetres. */
  readonly by: Place
}) {
  const { items, view, size, height, by } = properties
  const shape = useRef<KonvaShape>(null)

  useLayoutEffect(() => {
    const node = shape.current
    const bounds = boundsOfAll(items)
    if (!node) return
    const seen = {
      left: (-view.x - size.width / 2) / view.scale,
      right: (-view.x + size.width * 1.5) / view.scale,
      top: (-view.y - size.height / 2) / view.scale,
      bottom: (-view.y + size.height * 1.5) / view.scale,
    }
    const left = Math.max(bounds.left - border, seen.left)
    const right = Math.min(bounds.right + border, seen.right)
    const top = Math.max(height - bounds.top - border, seen.top)
    const bottom = Math.min(height - bounds.bottom + border, seen.bottom)
    if (right <= left || bottom <= top) return
    node.cache({
      x: left,
      y: top,
      width: right - left,
      height: bottom - top,
      pixelRatio: view.scale * window.devicePixelRatio,
    })
    return () => {
      node.clearCache()
    }
  }, [items, view, size, height])

  const moved = { ...view, x: view.x + by.x * view.scale, y: view.y - by.y * view.scale }
  return <SceneShape items={items} view={moved} height={height} shape={shape} />
}
