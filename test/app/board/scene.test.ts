import { describe, expect, it } from 'vitest'
import { sceneOfAnswer } from '../../../src/app/board/scene'
import { answerOf, createStore, evaluationShown } from '../../../src/app/store'
import { type Item, paletteOf, type Scene } from '../../../src/drawing'
import { evaluate } from '../../../src/sheet/estimate'
import { phasor, sheetOf, sum } from '../../drawing/sheets'

/** A voltage is solved from the supply and the other one. */
const sheet = sheetOf(
  [
    phasor('V1', '30.0', '0'),
    { id: 'V2', label: 'V2', quantity: 'voltage' },
    phasor('VS', '50.0', '53.1'),
    { ...phasor('I', '1.00', '0'), quantity: 'current' },
  ],
  { reference: 'V1', sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] },
)
const { thin, quantities } = paletteOf('light')

/** A store with the sheet's whole answer in it, and the edit made after it came. */
function edited() {
  const store = createStore(sheet, 'new')
  store.getState().receiveAnswer(sheet, evaluate(sheet))
  store.getState().edit({ kind: 'drag-tip', id: 'VS', magnitude: 60, angle: 53.1 })
  return store.getState().history.sheet
}

function inkOf(scene: Scene, phasorId: string): unknown {
  const keys = scene.arrows.filter((arrow) => arrow.phasor === phasorId).map(({ key }) => key)
  const shaft = scene.items.find(
    (item: Item) => item.part === 'arrow' && keys.includes(item.arrow ?? ''),
  )
  return shaft?.kind === 'lines' ? shaft.stroke : undefined
}

describe('until the new answer comes, the board', () => {
  it('draws what was solved from the sheet before in grey, and nothing else', () => {
    const next = edited()
    const before = sceneOfAnswer(answerOf(sheet), 'light', {})
    const waiting = sceneOfAnswer(answerOf(next), 'light', {})
    expect(inkOf(waiting, 'V2')).toBe(thin)
    expect(inkOf(waiting, 'V1')).toBe(quantities.voltage)
    expect(inkOf(waiting, 'I')).toBe(quantities.current)
    expect(waiting.items.filter(({ part }) => part === 'arrow').length).toBe(
      before.items.filter(({ part }) => part === 'arrow').length,
    )
  })

  it('draws the adjusted values of the sheet before, all of them in grey', () => {
    const next = edited()
    const waiting = sceneOfAnswer(answerOf(next), 'light', { values: 'adjusted' })
    for (const id of ['V1', 'V2', 'VS', 'I']) expect(inkOf(waiting, id)).toBe(thin)
    const shown = evaluationShown(answerOf(next), 'adjusted').phasors[2]
    expect(shown?.magnitude).toBe(50)
  })

  it('draws no verdict where the exact drawing is hidden', () => {
    createStore(sheet, 'new').getState().receiveAnswer(sheet, evaluate(sheet))
    const stamps = ({ items }: Scene) => items.filter(({ part }) => part === 'stamp').length
    expect(stamps(sceneOfAnswer(answerOf(sheet), 'light', {}))).toBeGreaterThan(0)
    const hidden = new Set(['s'])
    expect(stamps(sceneOfAnswer(answerOf(sheet), 'light', { hidden }))).toBe(0)
  })
})
