import { describe, expect, it } from 'vitest'
import { gripAt, layout } from '../../src/drawing'
import { quick, type Sheet } from '../../src/sheet'
import { phasor, sheetOf, sum } from './sheets'

const closing = sheetOf(
  [phasor('V1', '30.0', '0'), phasor('V2', '40.0', '90'), phasor('VS', '50.0', '53.13')],
  { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] },
)

function gripIn(sheet: Sheet, key: string, selected?: string) {
  const scene = layout(sheet, quick(sheet), { labels: false })
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}.`)
  return gripAt(sheet, scene, arrow.to, 3, selected)
}

describe('taking hold of an arrow', () => {
  it('takes a tip that can be dragged where several tips meet', () => {
    expect(gripIn(closing, 'resultant:s')).toMatchObject({
      at: 'tip',
      arrow: { key: expect.stringMatching(/^(term|measured)/) },
      held: undefined,
    })
  })

  it('takes the tip of the selected phasor first', () => {
    expect(gripIn(closing, 'resultant:s', 'V2')?.arrow.phasor).toBe('V2')
    expect(gripIn(closing, 'resultant:s', 'VS')?.arrow.phasor).toBe('VS')
  })

  it('takes the body away from the tip, and nothing beyond its reach', () => {
    const scene = layout(closing, quick(closing), { labels: false })
    const arrow = scene.arrows.find(({ key }) => key === 'term:s:0')
    if (!arrow) throw new Error('There is no first term.')
    const middle = { x: (arrow.from.x + arrow.to.x) / 2, y: arrow.from.y }
    expect(gripAt(closing, scene, middle, 2)).toMatchObject({ at: 'body', arrow: { phasor: 'V1' } })
    expect(gripAt(closing, scene, { x: middle.x, y: middle.y - 2.5 }, 2)).toBeUndefined()
  })
})
