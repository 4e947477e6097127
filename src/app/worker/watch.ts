import type { Sheet } from '../../sheet'
import { answerOf, type Store } from '../store'
import type { Estimator } from './estimator'

/** Until so many milliseconds have passed, nobody needs to be told that there is something to wait for. */
export const PATIENCE = 1000

/** The timers of the page, so that a test can stand in for them. */
export interface Timers {
  setTimeout(act: () => void, milliseconds: number): number
  clearTimeout(timer: number): void
}

/**
 * Keeps the whole answer of a store's open sheet: every sheet that is opened, edited or gone back to is
 * worked out, and the work on the one before is given up. A draft is not: a drag has the quick half.
 */
export function watchEstimate(store: Store, estimator: Estimator, timers: Timers): void {
  let asked: Sheet | undefined
  let timer: number | undefined
  const settle = () => {
    if (timer !== undefined) timers.clearTimeout(timer)
    timer = undefined
  }
  const look = () => {
    const { history, receiveAnswer, setProgress, progress } = store.getState()
    const { sheet } = history
    if (sheet === asked) return
    asked = sheet
    settle()
    if (answerOf(sheet).whole) {
      estimator.giveUp()
      if (progress.state !== 'resting') setProgress({ state: 'resting' })
      return
    }
    setProgress({ state: 'working' })
    timer = timers.setTimeout(() => setProgress({ state: 'slow' }), PATIENCE)
    estimator.ask(sheet, (reply) => {
      settle()
      if (reply.ok) {
        receiveAnswer(sheet, reply.evaluation)
        setProgress({ state: 'resting' })
      } else {
        setProgress({ state: 'failed', text: sentenceOf(reply.reason) })
      }
    })
  }
  store.subscribe(look)
  look()
}

function sentenceOf(reason: string): string {
  const bare = reason.trim().replace(/\.$/, '')
  return `The best values could not be worked out (${bare}). Figures as read are right all the same; any edit tries again.`
}

/** Settles when the open sheet has its whole answer, when it can have none, or when time is up. */
export function settledAnswer(store: Store, milliseconds: number): Promise<boolean> {
  const isWhole = () => answerOf(store.getState().history.sheet).whole !== undefined
  const isOver = () => isWhole() || store.getState().progress.state === 'failed'
  if (isOver()) return Promise.resolve(isWhole())
  return new Promise((resolve) => {
    const done = () => {
      stop()
      clearTimeout(timer)
      resolve(isWhole())
    }
    const timer = setTimeout(done, milliseconds)
    const stop = store.subscribe(() => {
      if (isOver()) done()
    })
  })
}
