import { describe, expect, it } from 'vitest'
import { createStore, type Store, shownEvaluation, shownSheet } from '../../../src/app/store'
import { exampleSheet } from '../../../src/sheet'
import { phasor, sheetOf, sum } from '../../drawing/sheets'

const sheet = sheetOf([phasor('V1', '30.0', '0'), phasor('V2', '40.0', '90')], {
  title: 'Two voltages',
  sums: [sum('s', ['V1', 'V2'])],
})

function dragTo(magnitude: number) {
  return { kind: 'drag-tip', id: 'V2', magnitude, angle: 90 } as const
}

function magnitudeOf(store: Store): number | undefined {
  return shownEvaluation(store.getState()).phasors[1]?.magnitude
}

describe('the store', () => {
  it('shows a draft without making it a step, and drops it without a trace', () => {
    const store = createStore(sheet, 'new')
    const before = store.getState()
    store.getState().preview(dragTo(50))
    expect(magnitudeOf(store)).toBe(50)
    expect(store.getState().history).toBe(before.history)
    store.getState().dropDraft()
    expect(store.getState()).toEqual(before)
    expect(magnitudeOf(store)).toBe(40)
  })

  it('counts an edit as one step, which undo takes back and redo does again', () => {
    const store = createStore(sheet, 'new')
    store.getState().preview(dragTo(45))
    store.getState().preview(dragTo(50))
    store.getState().edit(dragTo(50))
    expect(store.getState().draft).toBeUndefined()
    expect(store.getState().history.past).toHaveLength(1)
    store.getState().undo()
    expect(store.getState().history.sheet).toBe(sheet)
    store.getState().redo()
    expect(magnitudeOf(store)).toBe(50)
  })

  it('refuses an edit in a sentence and keeps the sheet', () => {
    const store = createStore(sheet, 'new')
    const made = store.getState().edit({ kind: 'move-phasor', id: 'missing', to: 0 })
    expect(made).toBe(false)
    expect(store.getState().history.sheet).toBe(sheet)
    expect(store.getState().notice).toMatchObject({ tone: 'problem' })
  })

  it('announces what was done and what the check line now says', () => {
    const store = createStore(sheet, 'new')
    store.getState().edit(dragTo(0))
    expect(store.getState().announcement).toMatch(/^Drag the tip of V2\..*calculated 30/)
  })

  it('lets go of a selection whose phasor is gone, and offers to undo', () => {
    const store = createStore(sheet, 'new')
    store.getState().select({ kind: 'phasor', id: 'V2' })
    store.getState().edit({ kind: 'remove-phasor', id: 'V2' })
    expect(store.getState().selection).toBeUndefined()
    expect(store.getState().notice?.offer).toBe('undo')
    expect(shownSheet(store.getState()).sums?.[0]?.terms).toEqual([{ phasor: 'V1' }])
  })

  it('draws as read again where a pen is taken up, and says so', () => {
    const store = createStore(sheet, 'new')
    store.getState().showValues('adjusted')
    store.getState().setPen({ mode: 'hand' })
    expect(store.getState().values).toBe('read')
    expect(store.getState().notice?.text).toContain('as read again')
  })

  it('puts the pen down where the adjusted values are shown, and says so', () => {
    const store = createStore(sheet, 'new')
    store.getState().setPen({ mode: 'hand' })
    expect(store.getState().notice).toBeUndefined()
    store.getState().showValues('adjusted')
    expect(store.getState().pen.mode).toBeUndefined()
    expect(store.getState().values).toBe('adjusted')
    expect(store.getState().notice?.text).toContain('pen is put down')
  })
})

it('an edit that voids a signature says so, and offers to take it back', () => {
  const store = createStore(exampleSheet, 'file')
  const { edit } = store.getState()
  edit({ kind: 'set-job', job: { checkedBy: 'A. Berg' } })
  expect(store.getState().notice).toBeUndefined()
  edit({ kind: 'set-reading', id: 'r2', change: { shown: '29.1' } })
  expect(store.getState().notice).toMatchObject({ tone: 'news', offer: 'undo' })
  expect(store.getState().notice?.text).toContain('checked by A. Berg')
  expect(store.getState().announcement).toContain('no longer holds')
  store.getState().undo()
  expect(store.getState().history.sheet.job?.checkedBy).toBe('A. Berg')
})
