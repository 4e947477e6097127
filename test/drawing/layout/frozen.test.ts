import { describe, expect, it } from 'vitest'
import { fan, phasor } from '../sheets'
import { arrowOf, lengthOf, sceneOf } from './scenes'

describe('a frozen layout', () => {
  it('keeps origin, scales and every start, whatever is drawn', () => {
    const before = sceneOf(fan)
    const [current, ...voltages] = fan.phasors
    const sheet = {
      ...fan,
      phasors: [{ ...current, ...phasor('I', '160', '0', 'current') }, ...voltages],
    }
    const after = sceneOf(sheet, { labels: false, frozen: before })
    expect(after.origin).toEqual(before.origin)
    expect(after.unitsPerCentimetre).toEqual(before.unitsPerCentimetre)
    expect(arrowOf(after, 'loose:I').from).toEqual(arrowOf(before, 'loose:I').from)
    expect(lengthOf(arrowOf(after, 'loose:I'))).toBeCloseTo(
      (160 / 1.62) * lengthOf(arrowOf(before, 'loose:I')),
      6,
    )
  })

  it('makes items for the arrows that are asked for alone, and lists all', () => {
    const before = sceneOf(fan)
    const only = new Set(['term:s1:1', 'resultant:s1'])
    const scene = sceneOf(fan, { frozen: before, only })
    expect(new Set(scene.items.map(({ arrow }) => arrow))).toEqual(only)
    expect(scene.arrows).toEqual(before.arrows)
  })
})
