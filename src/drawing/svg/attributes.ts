import { formatMillimetres } from './number'

/** How an outline is painted: nothing is filled and nothing stroked unless it is said. */
export interface Paint {
  readonly stroke?: string
  readonly width?: number
  readonly dash?: readonly number[]
  readonly fill?: string
}

/** Paint as presentation attributes, each with a space before it. */
export function paintAttributes({ stroke, width = 0, dash, fill = 'none' }: Paint): string {
  const filled = ` fill="${fill}"`
  if (stroke === undefined) return filled
  const stroked = `${filled} stroke="${stroke}" stroke-width="${formatMillimetres(width)}"`
  return dash ? `${stroked} stroke-dasharray="${dash.map(formatMillimetres).join(' ')}"` : stroked
}
