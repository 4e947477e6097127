import type { RuleAndProtractor } from '../../drawing'
import { fitView, panView, type Size, type View, zoomView } from './view'

const step = 40
const pans: { readonly [key: string]: readonly [number, number] } = {
  ArrowLeft: [step, 0],
  ArrowRight: [-step, 0],
  ArrowUp: [0, step],
  ArrowDown: [0, -step],
}
const zooms: { readonly [key: string]: number } = { '+': 1.25, '=': 1.25, '-': 0.8 }

/** The view after a key: arrows move it, + and − zoom, 0 shows the whole sheet. Undefined for others. */
export function viewAfterKey(key: string, view: View, board: Size, paper: Size): View | undefined {
  const pan = pans[key]
  if (pan) return panView(view, pan[0], pan[1], board, paper)
  const zoom = zooms[key]
  if (zoom) return zoomView(view, zoom, { x: board.width / 2, y: board.height / 2 })
  return key === '0' ? fitView(board, paper) : undefined
}

const nudges: { readonly [key: string]: RuleAndProtractor } = {
  ArrowUp: { millimetres: 1, degrees: 0 },
  ArrowDown: { millimetres: -1, degrees: 0 },
  ArrowLeft: { millimetres: 0, degrees: 1 },
  ArrowRight: { millimetres: 0, degrees: -1 },
}

/**
 * What a key does to the arrow that is picked: up and down by 1 mm of length, left (anticlockwise) and
 * right by 1°, a tenth of it with Shift. Undefined for other keys.
 */
export function nudgeOfKey(event: {
  readonly key: string
  readonly shiftKey: boolean
  readonly ctrlKey: boolean
  readonly metaKey: boolean
  readonly altKey: boolean
}): RuleAndProtractor | undefined {
  const by = nudges[event.key]
  if (!by || event.ctrlKey || event.metaKey || event.altKey) return undefined
  const part = event.shiftKey ? 0.1 : 1
  return { millimetres: by.millimetres * part, degrees: by.degrees * part }
}
