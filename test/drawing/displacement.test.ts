import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { displacementBetween, layout, type Scene } from '../../src/drawing'
import { quick, type Sheet } from '../../src/sheet'
import { phasor, sheetOf, sum } from './sheets'

const ids = ['V1', 'V2', 'V3', 'V4', 'V5']

function chainWith(second: { magnitude: string; angle: string }): Sheet {
  return sheetOf(
    ids.map((id, index) =>
      id === 'V2'
        ? phasor(id, second.magnitude, second.angle)
        : phasor(id, String(10 + index), String(index * 40)),
    ),
    { sums: [sum('s', ids)] },
  )
}

function sceneOf(sheet: Sheet, frozen?: Scene): Scene {
  return layout(sheet, quick(sheet), { labels: false, ...(frozen && { frozen }) })
}

describe('what an edit does to the arrows', () => {
  it('leaves those before a changed term, carries those after it, and draws it and the resultant anew', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: -179, max: 180 }),
        (magnitude, angle) => {
          fc.pre(magnitude !== 20 || angle !== 45)
          const before = sceneOf(chainWith({ magnitude: '20', angle: '45' }))
          const changed = chainWith({ magnitude: String(magnitude), angle: String(angle) })
          const { live, carried } = displacementBetween(before, sceneOf(changed, before))
          expect([...live].sort()).toEqual(['resultant:s', 'term:s:1'])
          expect(carried.map((group) => [...group].sort())).toEqual([
            ['term:s:2', 'term:s:3', 'term:s:4'],
          ])
        },
      ),
    )
  })

  it('carries in two directions what hangs on a phasor and on its reverse', () => {
    const make = (magnitude: string) =>
      sheetOf([phasor('V1', magnitude, '90'), phasor('V2', '10', '30')], {
        sums: [sum('a', ['V1', 'V2']), sum('b', ['−V1', 'V2'])],
      })
    const before = sceneOf(make('20'))
    const { carried } = displacementBetween(before, sceneOf(make('25'), before))
    expect(carried.map((group) => [...group])).toEqual([['term:a:1'], ['term:b:1']])
  })

  it('finds nothing between a scene and itself', () => {
    const scene = sceneOf(chainWith({ magnitude: '20', angle: '45' }))
    expect(displacementBetween(scene, scene)).toEqual({ live: new Set(), carried: [] })
  })
})
