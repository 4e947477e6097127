import type { Measure } from '../measure'
import { withBoard } from '../pages'

/** A frame of the board against painting the same picture straight on a canvas. */
function frameMeasure(name: string, goal: number, sheet: string, kind: 'drag' | 'redraw'): Measure {
  return {
    name,
    goal,
    measure: () =>
      withBoard(sheet, async (page) => {
        if (kind === 'drag') {
          const { x, y } = await page.evaluate(() => window.board.tip)
          await page.mouse.move(x, y)
          await page.mouse.down()
          await page.mouse.move(x + 12, y + 12, { steps: 3 })
        }
        return page.evaluate((which) => window.board[which](), kind)
      }),
  }
}

/** The first term is dragged, and all the others hang on its tip. */
export const dragFirstOf100 = frameMeasure(
  'a frame while the first of 100 terms is dragged, against the whole picture straight on a canvas',
  1,
  'chain=100',
  'drag',
)

/** One loose phasor is dragged among many that stand still. */
export const dragLooseAmong1000 = frameMeasure(
  'a frame while one loose phasor among 1,000 is dragged, against the whole picture straight on a canvas',
  0.15,
  'loose=1000',
  'drag',
)

/** A new arrow is drawn, with rule and protractor, among many that stand still. */
export const drawAmong100 = frameMeasure(
  'a frame while a new arrow is drawn among 100 phasors, against the whole picture straight on a canvas',
  1,
  'loose=100&draw',
  'drag',
)

/** The same among the most phasors that a sheet has. */
export const drawAmong2000 = frameMeasure(
  'a frame while a new arrow is drawn among 2,000 phasors, against the whole picture straight on a canvas',
  0.15,
  'loose=2000&draw',
  'drag',
)

/** Everything is drawn anew, as while panning. */
export const redraw1000 = frameMeasure(
  'a full redraw of 1,000 phasors, against the same picture straight on a canvas',
  1.3,
  'loose=1000',
  'redraw',
)
