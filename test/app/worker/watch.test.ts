import { describe, expect, it } from 'vitest'
import { answerOf, createStore, shownAnswer } from '../../../src/app/store'
import { type Estimator, type Reply, watchEstimate } from '../../../src/app/worker'
import type { Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { phasor, sheetOf, sum } from '../../drawing/sheets'

/** Two sides of a triangle of which nobody read the third. */
function triangle(): Sheet {
  return sheetOf(
    [
      phasor('V1', '30.0', '0'),
      phasor('V2', '40.0', '90'),
      { id: 'VS', label: 'VS', quantity: 'voltage' },
    ],
    { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] },
  )
}

function createWorld(sheet: Sheet) {
  const store = createStore(sheet, 'new')
  const asked: { sheet: Sheet; answered: (reply: Reply) => void }[] = []
  const estimator: Estimator = {
    ask: (each, answered) => asked.push({ sheet: each, answered }),
    giveUp: () => undefined,
  }
  let late: (() => void) | undefined
  watchEstimate(store, estimator, {
    setTimeout: (act) => {
      late = act
      return 1
    },
    clearTimeout: () => {
      late = undefined
    },
  })
  const solve = () => {
    const last = asked.at(-1)
    if (last) last.answered({ ok: true, evaluation: evaluate(last.sheet) })
  }
  const angleOfSupply = () => shownAnswer(store.getState()).evaluation.phasors[2]?.angle
  return { store, asked, solve, angleOfSupply, wait: () => late?.() }
}

function longer(magnitude: number) {
  return { kind: 'drag-tip', id: 'V2', magnitude, angle: 90 } as const
}

describe('the whole answer of the open sheet', () => {
  it('lands in the store, and the page shows what is solved', () => {
    const { store, solve, angleOfSupply } = createWorld(triangle())
    expect(angleOfSupply()).toBeUndefined()
    expect(store.getState().progress.state).toBe('working')
    solve()
    expect(angleOfSupply()).toBeCloseTo(53.13, 2)
    expect(store.getState().answer?.sheet).toBe(store.getState().history.sheet)
    expect(store.getState().progress.state).toBe('resting')
  })

  it('stays as the former one while an edit waits for its own', () => {
    const { store, solve, angleOfSupply } = createWorld(triangle())
    solve()
    const { whole } = shownAnswer(store.getState())
    store.getState().edit(longer(30))
    expect(store.getState().answer?.sheet).not.toBe(store.getState().history.sheet)
    expect(shownAnswer(store.getState()).former).toBe(whole)
    expect(angleOfSupply()).toBeCloseTo(53.13, 2)
    solve()
    expect(shownAnswer(store.getState()).former).toBeUndefined()
    expect(angleOfSupply()).toBeCloseTo(45, 2)
  })

  it('is not asked for a draft, nor again for a sheet that has it', () => {
    const { store, asked, solve } = createWorld(triangle())
    solve()
    store.getState().preview(longer(30))
    expect(asked).toHaveLength(1)
    store.getState().edit(longer(30))
    expect(asked).toHaveLength(2)
    store.getState().undo()
    expect(asked).toHaveLength(2)
    expect(answerOf(store.getState().history.sheet).whole).toBeDefined()
    expect(store.getState().progress.state).toBe('resting')
  })

  it('is said to be slow when it takes its time, until it comes', () => {
    const { store, solve, wait } = createWorld(triangle())
    wait()
    expect(store.getState().progress.state).toBe('slow')
    solve()
    expect(store.getState().progress.state).toBe('resting')
  })

  it('is missed in one sentence where it fails, and the quick half goes on', () => {
    const { store, asked } = createWorld(triangle())
    asked[0]?.answered({ ok: false, reason: 'out of memory' })
    expect(store.getState().progress).toMatchObject({
      state: 'failed',
      text: expect.stringContaining('out of memory'),
    })
    store.getState().edit(longer(30))
    expect(shownAnswer(store.getState()).evaluation.phasors[1]?.magnitude).toBe(30)
  })
})
