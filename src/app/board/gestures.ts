import {
  type Drop,
  dragBody,
  dragTip,
  dropAt,
  type Grip,
  gripAt,
  pinDrawing,
  type Scene,
  type Stroke,
  snapTail,
  strokeTo,
  type Tail,
  type TipDrag,
} from '../../drawing'
import { labelOf, type Place, type Sheet } from '../../sheet'
import { answerOf, nameOfSum, type Selection, type Store } from '../store'
import { panView, type Size, toPaper, type View, zoomView } from './view'

/** What the gestures read from the board and tell it. Points are CSS pixels from its corner. */
export interface GestureHost {
  readonly store: Store
  scene(): Scene
  view(): View
  size(): Size
  setView(view: View): void
  /** A drag has begun from this scene, or is over. */
  setBase(scene: Scene | undefined): void
  setReadout(readout: Readout | undefined): void
  setGrip(grip: Grip | undefined): void
  /** A new arrow is being drawn, or is not any more. */
  setStroke(stroke: DrawnStroke | undefined): void
  /** A new arrow was drawn and let go: what is it? */
  finishStroke(stroke: Stroke): void
}

/** A new arrow that is being drawn, and where the pointer is. */
export interface DrawnStroke {
  readonly stroke: Stroke
  readonly at: Place
  readonly touch: boolean
}

/**
 * What the readout beside the pointer says: what a dragged tip comes to, or what letting go of a body
 * would do.
 */
export type Readout = { readonly at: Place; readonly touch: boolean } & (
  | { readonly grip: Grip; readonly drag: TipDrag }
  | { readonly hint: string }
)

/** One pointer event, as far as the gestures need it. */
export interface PointerInput {
  readonly pointer: number
  readonly point: Place
  readonly touch: boolean
  readonly button: number
  /** The key that frees the tip from whole millimetres and degrees is down. */
  readonly free: boolean
}

/** What the board does with its pointers. */
export interface Gestures {
  down(input: PointerInput): void
  move(input: PointerInput): void
  up(input: PointerInput): void
  /** Ends whatever goes on without a trace. */
  cancel(): void
  wheel(point: Place, by: number): void
}

type Gesture =
  | {
      readonly kind: 'pan'
      readonly pointer: number
      readonly last: Place
      readonly moved: boolean
    }
  | { readonly kind: 'pinch'; readonly span: number; readonly centre: Place }
  | {
      readonly kind: 'drag'
      readonly pointer: number
      readonly grip: Grip
      readonly from: Place
      readonly started: boolean
      readonly base: Scene
      readonly sheet: Sheet
      /** What letting go would do beside moving the body. */
      readonly drop?: Drop | undefined
    }
  | {
      readonly kind: 'draw'
      readonly pointer: number
      readonly tail: Tail
      readonly stroke?: Stroke
    }

/** Why nothing can be dragged while the adjusted values are drawn: they follow from the readings. */
export const ADJUSTED_IS_HELD =
  'These are the adjusted values: show the readings as read to change the drawing.'
/** A shorter stroke was a slip of the hand, in millimetres. */
const shortest = 1
const slack = 4
const reachOfMouse = 9
const reachOfFinger = 24

/** Makes the board's gestures: one pointer drags a tip, a body or the paper, or draws; two pan and zoom. */
export function createGestures(host: GestureHost): Gestures {
  const pointers = new Map<number, Place>()
  let gesture: Gesture | undefined

  const gripFor = (input: PointerInput): Grip | undefined => {
    const state = host.store.getState()
    const scene = host.scene()
    const place = toPaper(host.view(), input.point, scene)
    const reach = (input.touch ? reachOfFinger : reachOfMouse) / host.view().scale
    const { selection } = state
    const selected = selection?.kind === 'sum' ? undefined : selection?.id
    const grip = gripAt(state.history.sheet, scene, place, reach, selected)
    return grip && state.values === 'adjusted' ? { ...grip, held: ADJUSTED_IS_HELD } : grip
  }

  const cancel = () => {
    gesture = undefined
    host.store.getState().dropDraft()
    host.setBase(undefined)
    host.setReadout(undefined)
    host.setStroke(undefined)
  }

  const startStroke = (input: PointerInput): boolean => {
    const { pen, history } = host.store.getState()
    if (pen.mode === undefined || pen.isAdjusting || input.button !== 0) return false
    const reach = (input.touch ? reachOfFinger : reachOfMouse) / host.view().scale
    const place = toPaper(host.view(), input.point, host.scene())
    const tail = snapTail(history.sheet, host.scene(), place, reach, pen.mode)
    gesture = { kind: 'draw', pointer: input.pointer, tail }
    return true
  }

  const draw = (now: Extract<Gesture, { kind: 'draw' }>, input: PointerInput) => {
    const { pen, history } = host.store.getState()
    if (pen.mode === undefined) return
    const place = toPaper(host.view(), input.point, host.scene())
    const stroke = strokeTo(history.sheet, now.tail, place, pen.mode, input.free)
    gesture = { ...now, stroke }
    host.setStroke({ stroke, at: input.point, touch: input.touch })
  }

  const startPinch = () => {
    cancel()
    const [one, other] = [...pointers.values()]
    if (one && other) gesture = { kind: 'pinch', ...spread(one, other) }
  }

  const pinch = (last: { span: number; centre: Place }) => {
    const [one, other] = [...pointers.values()]
    if (!one || !other) return
    const next = spread(one, other)
    const zoomed = zoomView(host.view(), next.span / Math.max(1, last.span), next.centre)
    const dx = next.centre.x - last.centre.x
    const dy = next.centre.y - last.centre.y
    host.setView(panView(zoomed, dx, dy, host.size(), host.scene()))
    gesture = { kind: 'pinch', ...next }
  }

  const drag = (now: Extract<Gesture, { kind: 'drag' }>, input: PointerInput) => {
    const { grip, base, sheet } = now
    if (!now.started && distance(now.from, input.point) < slack) return
    if (!now.started) {
      if (grip.held !== undefined) {
        host.store.getState().notify({ tone: 'news', text: grip.held })
        gesture = { kind: 'pan', pointer: now.pointer, last: input.point, moved: true }
        return
      }
      gesture = { ...now, started: true }
      host.setBase(base)
    }
    const place = toPaper(host.view(), input.point, base)
    if (grip.at === 'tip') {
      const { evaluation } = answerOf(sheet)
      const result = dragTip(sheet, evaluation, base, grip.arrow, place, input.free)
      if (!result.ok) return
      host.store.getState().preview(result.value.edit)
      host.setReadout({ at: input.point, touch: input.touch, grip, drag: result.value })
      return
    }
    const from = toPaper(host.view(), now.from, base)
    const by = { x: place.x - from.x, y: place.y - from.y }
    const edit = dragBody(sheet, base, grip.arrow, by, input.free)
    if (edit) host.store.getState().preview(edit)
    const tail = { x: grip.arrow.from.x + by.x, y: grip.arrow.from.y + by.y }
    const reach = (input.touch ? reachOfFinger : reachOfMouse) / host.view().scale
    const drop = dropAt(sheet, base, grip.arrow, tail, reach)
    gesture = { ...now, started: true, drop }
    const hint = drop && hintOf(sheet, drop)
    host.setReadout(hint === undefined ? undefined : { at: input.point, touch: input.touch, hint })
  }

  return {
    down: (input) => {
      pointers.set(input.pointer, input.point)
      if (pointers.size > 1) return startPinch()
      if (startStroke(input)) return
      const { select, history } = host.store.getState()
      const grip = input.button === 0 ? gripFor(input) : undefined
      if (!grip) {
        gesture = { kind: 'pan', pointer: input.pointer, last: input.point, moved: false }
        return
      }
      select(selectionOf(grip))
      gesture = {
        kind: 'drag',
        pointer: input.pointer,
        grip,
        from: input.point,
        started: false,
        base: host.scene(),
        sheet: history.sheet,
      }
    },
    move: (input) => {
      if (!pointers.has(input.pointer)) {
        const { pen } = host.store.getState()
        const isDrawing = pen.mode !== undefined && !pen.isAdjusting
        host.setGrip(isDrawing ? undefined : gripFor(input))
        return
      }
      pointers.set(input.pointer, input.point)
      if (gesture?.kind === 'pinch') pinch(gesture)
      else if (gesture?.kind === 'drag') drag(gesture, input)
      else if (gesture?.kind === 'draw') draw(gesture, input)
      else if (gesture?.kind === 'pan') {
        const dx = input.point.x - gesture.last.x
        const dy = input.point.y - gesture.last.y
        if (!gesture.moved && Math.hypot(dx, dy) < slack) return
        host.setView(panView(host.view(), dx, dy, host.size(), host.scene()))
        gesture = { ...gesture, last: input.point, moved: true }
      }
    },
    up: (input) => {
      pointers.delete(input.pointer)
      const ended = gesture
      if (ended?.kind === 'pinch') {
        if (pointers.size < 2) gesture = undefined
        return
      }
      gesture = undefined
      if (ended?.kind === 'drag' && ended.started) {
        host.setReadout(undefined)
        const { draft, edit } = host.store.getState()
        const made = ended.drop?.edit ?? draft?.edit
        if (made) edit(pinDrawing(ended.sheet, ended.base, made))
        host.setBase(undefined)
      } else if (ended?.kind === 'draw') {
        host.setStroke(undefined)
        const { stroke } = ended
        if (stroke && stroke.millimetres >= shortest) host.finishStroke(stroke)
      } else if (ended?.kind === 'pan' && !ended.moved) {
        host.store.getState().select(undefined)
      }
    },
    cancel: () => {
      pointers.clear()
      cancel()
    },
    wheel: (point, by) => host.setView(zoomView(host.view(), 1.0015 ** -by, point)),
  }
}

function hintOf(sheet: Sheet, { sum, on }: Drop): string {
  const found = sheet.sums?.find(({ id }) => id === sum)
  return found
    ? `Let go: a term of ${nameOfSum(sheet, found)}`
    : `Let go: hung on the tip of ${labelOf(sheet, on)}`
}

function selectionOf({ arrow }: Grip): Selection | undefined {
  if (arrow.hand !== undefined) return { kind: 'hand', id: arrow.hand }
  if (arrow.phasor !== undefined) return { kind: 'phasor', id: arrow.phasor }
  return arrow.sum === undefined ? undefined : { kind: 'sum', id: arrow.sum }
}

function spread(one: Place, other: Place): { span: number; centre: Place } {
  return {
    span: distance(one, other),
    centre: { x: (one.x + other.x) / 2, y: (one.y + other.y) / 2 },
  }
}

function distance(one: Place, other: Place): number {
  return Math.hypot(one.x - other.x, one.y - other.y)
}
