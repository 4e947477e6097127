import type { Page } from '@playwright/test'
import type { Place } from '../../src/sheet'

/** Fingers on the screen, in the order in which they came; each call says where all of them are. */
export interface Fingers {
  /** Puts down the last of these fingers. */
  down(...points: readonly Place[]): Promise<void>
  /** Moves the fingers to these points, over several steps. */
  move(...points: readonly Place[]): Promise<void>
  /** Lifts all fingers but these. */
  lift(...points: readonly Place[]): Promise<void>
  /** The system takes the fingers away, as it does for a gesture of its own. */
  lose(): Promise<void>
}

const steps = 8

/** Touches the page through the browser's own input, as a touch screen does. */
export async function touch(page: Page): Promise<Fingers> {
  const session = await page.context().newCDPSession(page)
  let last: readonly Place[] = []
  const send = async (
    type: 'touchStart' | 'touchMove' | 'touchEnd' | 'touchCancel',
    points: readonly Place[],
  ) => {
    const touchPoints = points.map(({ x, y }, id) => ({ x, y, id }))
    await session.send('Input.dispatchTouchEvent', { type, touchPoints })
    last = points
  }
  return {
    down: (...points) => send('touchStart', points),
    move: async (...points) => {
      const from = last
      for (let step = 1; step <= steps; step += 1) {
        const part = step / steps
        await send(
          'touchMove',
          points.map(({ x, y }, at) => {
            const start = from[at] ?? { x, y }
            return { x: start.x + part * (x - start.x), y: start.y + part * (y - start.y) }
          }),
        )
      }
    },
    lift: (...points) => send('touchEnd', points),
    lose: () => send('touchCancel', []),
  }
}
