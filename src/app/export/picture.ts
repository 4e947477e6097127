import type { Scene } from '../../drawing'
import type { Sheet } from '../../sheet'
import { drawnScene, paintItems, sceneOfAnswer, type ViewOptions } from '../board'
import { loadFonts } from '../fonts'
import { answerOf, quickAnswer } from '../store'

const dotsPerMillimetre = 300 / 25.4

/**
 * The scene that is given out: as read and always in the colours of paper, whatever the screen shows.
 * Whatever is of an older sheet, the verdict and what was solved, is left out.
 */
export function printedScene(sheet: Sheet, view: ViewOptions = {}): Scene {
  const { whole } = answerOf(sheet)
  return whole ? drawnScene(sheet, 'light', view) : sceneOfAnswer(quickAnswer(sheet), 'light', view)
}

/** The drawing as a PNG at 300 dots an inch; fails where the browser cannot make one. */
export async function toPng(sheet: Sheet, view?: ViewOptions): Promise<Blob> {
  await loadFonts()
  const scene = printedScene(sheet, view)
  const canvas = document.createElement('canvas')
  canvas.width = Math.round(scene.width * dotsPerMillimetre)
  canvas.height = Math.round(scene.height * dotsPerMillimetre)
  const pen = canvas.getContext('2d')
  if (!pen) throw new Error('The browser has no canvas to paint on.')
  pen.scale(dotsPerMillimetre, dotsPerMillimetre)
  paintItems(pen, scene.items, scene.height)
  return new Promise((resolve, reject) => {
    canvas.toBlob(
      (blob) => (blob ? resolve(blob) : reject(new Error('The browser made no picture.'))),
      'image/png',
    )
  })
}
