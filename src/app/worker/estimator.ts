import type { Evaluation, Sheet } from '../../sheet'

/** What a worker answers: a whole evaluation, or why there is none. */
export type Reply =
  | { readonly ok: true; readonly evaluation: Evaluation }
  | { readonly ok: false; readonly reason: string }

/** The part of a browser's worker that is needed, so that a test can stand in for it. */
export interface EstimateWorker {
  postMessage(sheet: Sheet): void
  terminate(): void
  addEventListener(kind: 'message', listener: (event: { readonly data: Reply }) => void): void
  addEventListener(kind: 'error', listener: (event: { readonly message?: string }) => void): void
}

/** Works sheets out, the newest alone: one at work hears nothing, so it is ended. */
export interface Estimator {
  /** Asks for a sheet; whatever was asked before is given up. `answered` is called once, or never. */
  ask(sheet: Sheet, answered: (reply: Reply) => void): void
  /** Gives up what was asked. */
  giveUp(): void
}

/**
 * An estimator with a worker that waits and a warm spare beside it: after one is ended, the next sheet
 * need not wait for another to start.
 */
export function createEstimator(createWorker: () => EstimateWorker): Estimator {
  let current: EstimateWorker | undefined
  let spare: EstimateWorker | undefined
  let waiting: ((reply: Reply) => void) | undefined

  const replace = () => {
    current?.terminate()
    current = spare
    spare = undefined
  }
  const settle = (reply: Reply) => {
    const answered = waiting
    waiting = undefined
    answered?.(reply)
  }
  const start = (): EstimateWorker => {
    const worker = createWorker()
    worker.addEventListener('message', ({ data }) => {
      if (worker === current) settle(data)
    })
    worker.addEventListener('error', ({ message }) => {
      if (worker === spare) spare = undefined
      if (worker !== current) return
      replace()
      settle({ ok: false, reason: message || 'its worker could not be started' })
    })
    return worker
  }
  return {
    ask: (sheet, answered) => {
      if (waiting) replace()
      current ??= start()
      waiting = answered
      current.postMessage(sheet)
      spare ??= start()
    },
    giveUp: () => {
      if (waiting) replace()
      waiting = undefined
    },
  }
}
