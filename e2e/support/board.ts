import type { Locator, Page } from '@playwright/test'
import { layout, type PlacedArrow, type Scene } from '../../src/drawing'
import { type Place, quick, type Sheet } from '../../src/sheet'
import { expect } from './test'

/** The paper as it lies on the screen, in CSS pixels of the window. */
export interface PaperOnScreen {
  readonly left: number
  readonly top: number
  readonly width: number
  readonly height: number
}

/** The drawing on the page. */
export function boardOf(page: Page): Locator {
  return page.getByRole('region', { name: 'Drawing' })
}

/** A sheet laid out here, in Node, by the code that the page draws with. */
export function sceneOf(sheet: Sheet): Scene {
  return layout(sheet, quick(sheet))
}

/** The arrow of a scene by its key. */
export function arrowOf(scene: Scene, key: string): PlacedArrow {
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}: ${scene.arrows.map((each) => each.key)}`)
  return arrow
}

/**
 * Where the paper lies, measured in the pixels of its canvas: what the paper covers is opaque, what it
 * covers in part is so in part, so the edges come out finer than a pixel. The whole paper must be in
 * sight.
 */
export async function paperOnScreen(page: Page): Promise<PaperOnScreen> {
  return boardOf(page)
    .locator('canvas')
    .first()
    .evaluate((canvas: HTMLCanvasElement) => {
      const pen = canvas.getContext('2d')
      if (!pen) throw new Error('The canvas has no context.')
      const pixels = pen.getImageData(0, 0, canvas.width, canvas.height)
      const corner = canvas.getBoundingClientRect()
      const ratio = canvas.width / corner.width
      const alpha = (x: number, y: number) =>
        (pixels.data[4 * (y * canvas.width + x) + 3] as number) / 255
      const spanOf = (length: number, cover: (at: number) => number) => {
        let sum = 0
        let moment = 0
        for (let at = 0; at < length; at += 1) {
          sum += cover(at)
          moment += cover(at) * (at + 0.5)
        }
        return { length: sum / ratio, start: (moment / sum - sum / 2) / ratio }
      }
      const middleOf = (length: number, isCovered: (at: number) => boolean) => {
        const covered = Array.from({ length }, (_, at) => at).filter(isCovered)
        return covered[Math.floor(covered.length / 2)] as number
      }
      const row = middleOf(canvas.height, (y) => {
        for (let x = 0; x < canvas.width; x += 4) if (alpha(x, y) === 1) return true
        return false
      })
      const across = spanOf(canvas.width, (x) => alpha(x, row))
      const column = Math.round((across.start + across.length / 2) * ratio)
      const down = spanOf(canvas.height, (y) => alpha(column, y))
      return {
        left: corner.left + across.start,
        top: corner.top + down.start,
        width: across.length,
        height: down.length,
      }
    })
}

/** Where a place on the paper, in millimetres with y up, lies in the window. */
export function toScreen(paper: PaperOnScreen, scene: Scene, place: Place): Place {
  return {
    x: paper.left + (place.x * paper.width) / scene.width,
    y: paper.top + ((scene.height - place.y) * paper.height) / scene.height,
  }
}

/** A place on the way from one to another: 0.5 is the middle. */
export function between(from: Place, to: Place, part: number): Place {
  return { x: from.x + part * (to.x - from.x), y: from.y + part * (to.y - from.y) }
}

/** A place so many millimetres away, at an angle in degrees. */
export function away(from: Place, millimetres: number, degrees: number): Place {
  const radians = (degrees * Math.PI) / 180
  return {
    x: from.x + millimetres * Math.cos(radians),
    y: from.y + millimetres * Math.sin(radians),
  }
}

/**
 * Whether an arrow or a label is painted at a point of the window: some pixel within a pixel of it is
 * covered on a canvas that lies above the empty sheet.
 */
export async function isInked(page: Page, point: Place): Promise<boolean> {
  return boardOf(page)
    .locator('canvas')
    .evaluateAll(
      (canvases, { x, y }) =>
        canvases.slice(1).some((element) => {
          const canvas = element as HTMLCanvasElement
          const corner = canvas.getBoundingClientRect()
          const ratio = canvas.width / corner.width
          const left = Math.round((x - corner.left) * ratio) - 2
          const top = Math.round((y - corner.top) * ratio) - 2
          const near = canvas.getContext('2d')?.getImageData(left, top, 4, 4)
          return near?.data.some((value, at) => at % 4 === 3 && value > 60) ?? false
        }),
      point,
    )
}

/** The sheet on the page's board, laid out in Node and found on the screen. */
export interface SheetOnScreen {
  readonly scene: Scene
  readonly paper: PaperOnScreen
  /** Where a place on the paper lies in the window. */
  at(place: Place): Place
  /** Where the tip of an arrow lies in the window. */
  tip(key: string): Place
  /** Where the middle of an arrow's shaft lies in the window. */
  middle(key: string): Place
}

/** Lays a sheet out and finds its paper on the screen, where all of it must be in sight. */
export async function sheetOnScreen(page: Page, sheet: Sheet): Promise<SheetOnScreen> {
  const scene = sceneOf(sheet)
  const paper = await paperOnScreen(page)
  expect(paper.width / paper.height, 'the whole paper is in sight').toBeCloseTo(
    scene.width / scene.height,
    1,
  )
  const at = (place: Place) => toScreen(paper, scene, place)
  return {
    scene,
    paper,
    at,
    tip: (key) => at(arrowOf(scene, key).to),
    middle: (key) => {
      const { from, to } = arrowOf(scene, key)
      return at(between(from, to, 0.5))
    },
  }
}

/** Takes hold at a point of the window and moves to another, as a hand does; the button stays down. */
export async function dragOver(page: Page, from: Place, to: Place): Promise<void> {
  await page.mouse.move(from.x, from.y)
  await page.mouse.down()
  await page.mouse.move(to.x, to.y, { steps: 10 })
}
