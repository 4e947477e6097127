import { describe, expect, it } from 'vitest'
import { fan, phasor, sheetOf, sum } from '../sheets'
import { arrowOf, sceneOf } from './scenes'

describe('a loose phasor', () => {
  it('starts at the origin', () => {
    const scene = sceneOf(sheetOf([phasor('V1', '10', '35')]))
    expect(arrowOf(scene, 'loose:V1').from).toEqual(scene.origin)
  })

  it('starts where the sheet places it', () => {
    const tail = { x: 71, y: 92 }
    const scene = sceneOf(sheetOf([{ ...phasor('V1', '10', '35'), tail }]))
    expect(arrowOf(scene, 'loose:V1').from).toEqual(tail)
  })

  it('hangs on the tip that it is hung on, also of a term and by way of others', () => {
    const hung = (id: string, on: string) => ({ ...phasor(id, '5', '40'), tail: { tipOf: on } })
    const sheet = sheetOf(
      [hung('B', 'A'), hung('A', 'V2'), phasor('V1', '9', '0'), phasor('V2', '7', '90')],
      {
        sums: [sum('s', ['V1', 'V2'])],
      },
    )
    const scene = sceneOf(sheet)
    expect(arrowOf(scene, 'loose:A').from).toEqual(arrowOf(scene, 'term:s:1').to)
    expect(arrowOf(scene, 'loose:B').from).toEqual(arrowOf(scene, 'loose:A').to)
  })

  it('starts at the origin where it hangs on its own tip, by way of others', () => {
    const hung = (id: string, on: string) => ({ ...phasor(id, '5', '40'), tail: { tipOf: on } })
    const scene = sceneOf(sheetOf([hung('A', 'B'), hung('B', 'A')]))
    expect(scene.arrows).toHaveLength(2)
    expect(arrowOf(scene, 'loose:A').from).toEqual(arrowOf(scene, 'loose:B').to)
  })

  it('may hang at the end of a chain of two thousand', () => {
    const phasors = Array.from({ length: 2000 }, (_, index) => ({
      ...phasor(`V${index}`, '1', '0'),
      ...(index < 1999 && { tail: { tipOf: `V${index + 1}` } }),
    }))
    const scene = sceneOf(sheetOf(phasors))
    expect(scene.arrows).toHaveLength(2000)
    expect(arrowOf(scene, 'loose:V0').from).toEqual(arrowOf(scene, 'loose:V1').to)
  })

  it('is set off 10 mm below an arrow along which it would lie', () => {
    const scene = sceneOf(fan)
    const [first, current] = [arrowOf(scene, 'term:s1:0'), arrowOf(scene, 'loose:I')]
    expect(current.from.x).toBeCloseTo(first.from.x, 9)
    expect(current.from.y).toBeCloseTo(first.from.y - 10, 9)
    expect(scene.starts.get('loose:I')).toEqual(current.from)
  })

  it('is set off a step for each of several that are alike', () => {
    const phasors = ['V1', 'V2', 'V3'].map((id) => phasor(id, '48.2', '30'))
    const scene = sceneOf(sheetOf(phasors))
    const starts = scene.arrows.map(({ from }) => `${from.x.toFixed(3)} ${from.y.toFixed(3)}`)
    expect(new Set(starts).size).toBe(3)
  })
})
