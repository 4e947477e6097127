import { describe, expect, it } from 'vitest'
import { createEstimator, type EstimateWorker, type Reply } from '../../../src/app/worker'
import { type Evaluation, quick, type Sheet } from '../../../src/sheet'
import { phasor, sheetOf } from '../../drawing/sheets'

const sheet = sheetOf([phasor('V1', '30.0', '0')])
const other = sheetOf([phasor('V2', '40.0', '0')])

/** A worker that answers when it is told to. */
class Hand implements EstimateWorker {
  readonly asked: Sheet[] = []
  isEnded = false
  private message: ((event: { readonly data: Reply }) => void) | undefined
  private error: ((event: { readonly message?: string }) => void) | undefined

  postMessage(asked: Sheet): void {
    this.asked.push(asked)
  }
  terminate(): void {
    this.isEnded = true
  }
  addEventListener(
    kind: 'message' | 'error',
    listener: (event: { readonly data: Reply; readonly message?: string }) => void,
  ): void {
    if (kind === 'message') this.message = listener as typeof this.message
    else this.error = listener as typeof this.error
  }
  answer(evaluation: Evaluation): void {
    this.message?.({ data: { ok: true, evaluation } })
  }
  fail(message: string): void {
    this.error?.({ message })
  }
}

function createWorld() {
  const workers: Hand[] = []
  const estimator = createEstimator(() => {
    const worker = new Hand()
    workers.push(worker)
    return worker
  })
  const replies: Reply[] = []
  const ask = (asked: Sheet) => estimator.ask(asked, (reply) => replies.push(reply))
  return { workers, estimator, replies, ask }
}

describe('the estimator in its worker', () => {
  it('starts one worker and a spare, and asks the same one again while it rests', () => {
    const { workers, replies, ask } = createWorld()
    ask(sheet)
    expect(workers).toHaveLength(2)
    workers[0]?.answer(quick(sheet))
    ask(other)
    expect(workers).toHaveLength(2)
    expect(workers[0]?.asked).toEqual([sheet, other])
    expect(replies).toEqual([{ ok: true, evaluation: quick(sheet) }])
  })

  it('ends a worker that is busy, goes on with the spare, and starts another', () => {
    const { workers, replies, ask } = createWorld()
    ask(sheet)
    ask(other)
    expect(workers.map(({ isEnded }) => isEnded)).toEqual([true, false, false])
    expect(workers[1]?.asked).toEqual([other])
    workers[0]?.answer(quick(sheet))
    expect(replies).toEqual([])
    workers[1]?.answer(quick(other))
    expect(replies).toEqual([{ ok: true, evaluation: quick(other) }])
  })

  it('says why a worker failed, and asks another the next time', () => {
    const { workers, replies, ask } = createWorld()
    ask(sheet)
    workers[0]?.fail('out of memory')
    expect(replies).toEqual([{ ok: false, reason: 'out of memory' }])
    ask(sheet)
    expect(workers[0]?.isEnded).toBe(true)
    expect(workers[1]?.asked).toEqual([sheet])
  })

  it('gives up what was asked without an answer', () => {
    const { workers, estimator, replies, ask } = createWorld()
    ask(sheet)
    estimator.giveUp()
    workers[0]?.answer(quick(sheet))
    expect(workers[0]?.isEnded).toBe(true)
    expect(replies).toEqual([])
  })
})
