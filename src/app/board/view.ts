import type { Place } from '../../sheet'

/** How the paper lies in the board: CSS pixels per millimetre, and where its upper left corner is. */
export interface View {
  readonly scale: number
  readonly x: number
  readonly y: number
}

/** A size in CSS pixels or in millimetres. */
export interface Size {
  readonly width: number
  readonly height: number
}

const margin = 14
const closest = 60
const farthest = 0.4

/** The view that shows the whole paper in the middle of the board. */
export function fitView(board: Size, paper: Size): View {
  const across = (board.width - 2 * margin) / paper.width
  const down = (board.height - 2 * margin) / paper.height
  const scale = Math.max(farthest, Math.min(across, down))
  return {
    scale,
    x: (board.width - paper.width * scale) / 2,
    y: (board.height - paper.height * scale) / 2,
  }
}

/** The view moved by so many CSS pixels; a corner of the paper always stays in sight. */
export function panView(view: View, dx: number, dy: number, board: Size, paper: Size): View {
  const seen = 40
  return {
    scale: view.scale,
    x: clamp(view.x + dx, seen - paper.width * view.scale, board.width - seen),
    y: clamp(view.y + dy, seen - paper.height * view.scale, board.height - seen),
  }
}

/** The view enlarged by a factor about a point of the board, which stays where it is. */
export function zoomView(view: View, factor: number, about: Place): View {
  const scale = clamp(view.scale * factor, farthest, closest)
  const grown = scale / view.scale
  return {
    scale,
    x: about.x - (about.x - view.x) * grown,
    y: about.y - (about.y - view.y) * grown,
  }
}

/** Where a point of the board lies on the paper, in millimetres with y up. */
export function toPaper(view: View, point: Place, paper: Size): Place {
  return {
    x: (point.x - view.x) / view.scale,
    y: paper.height - (point.y - view.y) / view.scale,
  }
}

/** Where a place on the paper lies on the board, in CSS pixels. */
export function toBoard(view: View, place: Place, paper: Size): Place {
  return {
    x: view.x + place.x * view.scale,
    y: view.y + (paper.height - place.y) * view.scale,
  }
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value))
}
