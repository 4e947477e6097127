import { Layer } from 'konva/lib/Layer'
import { flushSync } from 'react-dom'
import { createRoot } from 'react-dom/client'
import { Board, drawnScene, paintItems } from '../../../src/app/board'
import { fitView, toBoard } from '../../../src/app/board/view'
import { loadFonts } from '../../../src/app/fonts'
import '../../../src/app/style.css'
import { createStore, StoreContext } from '../../../src/app/store'
import type { PlacedArrow, Scene } from '../../../src/drawing'
import { millisecondsOf, ratioOfMedians } from '../measure'
import { chainSheet, looseSheet } from './sheets'
import './style.css'

const size = { width: 1000, height: 700 }
const rounds = 40

/** Layers that would be drawn at the next frame: the measure draws them itself, to have the time. */
const pending = new Set<Layer>()
Layer.prototype.batchDraw = function batchDraw(this: Layer) {
  pending.add(this)
  return this
}

const canvas = document.createElement('canvas')
Object.assign(canvas, size)
const pen = canvas.getContext('2d') as CanvasRenderingContext2D

/** Drawing is put off until somebody looks: reading a dot makes it happen now. */
function settle(context: CanvasRenderingContext2D): void {
  context.getImageData(0, 0, 1, 1)
}

function drawPending(): void {
  for (const layer of pending) {
    layer.draw()
    settle(layer.getCanvas().getContext()._context)
  }
  pending.clear()
}

/** The whole picture straight on a canvas: the same painting, and nothing else. */
function paintStraight(scene: Scene): number {
  const view = fitView(size, scene)
  return millisecondsOf(() => {
    pen.setTransform(1, 0, 0, 1, 0, 0)
    pen.clearRect(0, 0, size.width, size.height)
    pen.setTransform(view.scale, 0, 0, view.scale, view.x, view.y)
    paintItems(pen, scene.items, scene.height)
    settle(pen)
  })
}

const sheet = location.search.includes('loose')
  ? looseSheet(Number(/\d+/.exec(location.search)?.[0]))
  : chainSheet(Number(/\d+/.exec(location.search)?.[0]))
const scene = drawnScene(sheet, 'light')
const first = scene.arrows.find(({ phasor }) => phasor === 'v0') as PlacedArrow
const tip = toBoard(fitView(size, scene), first.to, scene)

/** One frame of what the mouse has begun, a drag or a new arrow: the pointer moves, the board is drawn. */
function dragFrame(step: number): number {
  const board = document.querySelector('.board') as HTMLElement
  const angle = step * 0.7
  const corner = board.getBoundingClientRect()
  return millisecondsOf(() => {
    flushSync(() => {
      board.dispatchEvent(
        new PointerEvent('pointermove', {
          pointerId: 1,
          bubbles: true,
          clientX: corner.left + tip.x + 30 * Math.cos(angle),
          clientY: corner.top + tip.y + 30 * Math.sin(angle),
        }),
      )
    })
    drawPending()
  })
}

function redrawAll(): number {
  const layers = [...pending, ...knownLayers]
  return millisecondsOf(() => {
    for (const layer of new Set(layers)) {
      layer.draw()
      settle(layer.getCanvas().getContext()._context)
    }
    pending.clear()
  })
}

const knownLayers: Layer[] = []

const measures = {
  /** Where the mouse takes hold of the first phasor. */
  tip,
  drag: () => {
    let step = 0
    return ratioOfMedians(
      { ours: () => dragFrame(++step), theirs: () => paintStraight(scene) },
      rounds,
    )
  },
  redraw: () => ratioOfMedians({ ours: redrawAll, theirs: () => paintStraight(scene) }, rounds),
}

declare global {
  interface Window {
    board: typeof measures
  }
}

async function start(): Promise<void> {
  await loadFonts()
  const store = createStore(sheet, 'new')
  if (location.search.includes('draw')) store.getState().setPen({ mode: 'phasor' })
  const root = createRoot(document.getElementById('root') as HTMLElement)
  flushSync(() =>
    root.render(
      <StoreContext value={store}>
        <Board />
      </StoreContext>,
    ),
  )
  await new Promise((resolve) => setTimeout(resolve, 300))
  knownLayers.push(...pending)
  drawPending()
  window.board = measures
}

void start()
