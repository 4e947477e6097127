import { useMemo } from 'react'
import { type Stroke, strokeItems, type Theme } from '../../drawing'
import { checkedSum, quantityOfSum, usePage } from '../store'
import { SceneShape } from './SceneShape'
import type { View } from './view'

/** The radius of the protractor in CSS pixels, so that it is as large on the screen however far one zooms. */
const radius = 110

/** A new arrow while it is drawn, with rule and protractor. */
export function StrokeShape(properties: {
  readonly stroke: Stroke
  readonly view: View
  readonly height: number
  readonly theme: Theme
}) {
  const { stroke, view, height, theme } = properties
  const mode = usePage((state) => state.pen.mode) ?? 'phasor'
  const quantity = usePage(({ history: { sheet }, chosenSum }) => {
    const sum = checkedSum(sheet, chosenSum)
    return sum ? quantityOfSum(sheet, sum) : 'voltage'
  })
  const items = useMemo(
    () => strokeItems(stroke, mode, quantity, radius / view.scale, theme),
    [stroke, mode, quantity, view.scale, theme],
  )
  return <SceneShape items={items} view={view} height={height} />
}
