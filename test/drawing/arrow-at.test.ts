import { describe, expect, it } from 'vitest'
import { arrowAt, layout } from '../../src/drawing'
import { quick, type Sheet } from '../../src/sheet'
import { fan, phasor, sheetOf } from './sheets'

const sceneOf = (sheet: Sheet) => layout(sheet, quick(sheet), { labels: false })

describe('the arrow at a point', () => {
  const scene = sceneOf(
    sheetOf([phasor('V1', '50', '0'), phasor('V2', '50', '90')], {
      drawing: { origin: { x: 60, y: 60 }, unitsPerCentimetre: { voltage: 5 } },
    }),
  )

  it('is met by its tip near the tip, and by its body along it', () => {
    expect(arrowAt(scene, { x: 159, y: 61 }, 3)).toMatchObject({
      arrow: { phasor: 'V1' },
      at: 'tip',
    })
    expect(arrowAt(scene, { x: 110, y: 62 }, 3)).toMatchObject({
      arrow: { phasor: 'V1' },
      at: 'body',
    })
    expect(arrowAt(scene, { x: 62, y: 110 }, 3)).toMatchObject({
      arrow: { phasor: 'V2' },
      at: 'body',
    })
  })

  it('is none where nothing is within reach', () => {
    expect(arrowAt(scene, { x: 110, y: 64 }, 3)).toBeUndefined()
    expect(arrowAt(scene, { x: 164, y: 60 }, 3)).toBeUndefined()
  })

  it('is a tip before any body, and the nearer of two tips', () => {
    const chain = sceneOf(fan)
    const term = chain.arrows.find(({ key }) => key === 'term:s1:0')
    expect(arrowAt(chain, term?.to ?? { x: 0, y: 0 }, 3)).toMatchObject({
      arrow: { key: 'term:s1:0' },
      at: 'tip',
    })
  })

  it('is a phasor before the resultant that ends in the same place', () => {
    const chain = sceneOf(fan)
    const last = chain.arrows.find(({ key }) => key === 'term:s1:2')
    expect(arrowAt(chain, last?.to ?? { x: 0, y: 0 }, 3)?.arrow.key).toBe('term:s1:2')
  })

  it('of a short arrow still has a body', () => {
    const short = sceneOf(
      sheetOf([phasor('V1', '2', '0')], {
        drawing: { origin: { x: 60, y: 60 }, unitsPerCentimetre: { voltage: 5 } },
      }),
    )
    expect(arrowAt(short, { x: 60, y: 60 }, 6)).toMatchObject({ at: 'body' })
    expect(arrowAt(short, { x: 64, y: 60 }, 6)).toMatchObject({ at: 'tip' })
  })

  it('may be one of no length', () => {
    const zero = sceneOf(sheetOf([phasor('I', '1', '90', 'current'), phasor('V1', '0', '0')]))
    expect(arrowAt(zero, zero.origin, 3)).toMatchObject({ arrow: { phasor: 'V1' }, at: 'tip' })
  })
})
