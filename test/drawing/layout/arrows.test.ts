import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { phasor, sheetOf } from '../sheets'
import { arrowOf, lengthOf, sceneOf } from './scenes'

describe('the length and direction of an arrow', () => {
  it('is 96.4 mm for 48.2 V at 5 V a centimetre', () => {
    const sheet = sheetOf([phasor('V1', '48.2', '82')], {
      drawing: { unitsPerCentimetre: { voltage: 5 } },
    })
    const arrow = arrowOf(sceneOf(sheet), 'loose:V1')
    expect(lengthOf(arrow)).toBeCloseTo(96.4, 9)
    const angle = Math.atan2(arrow.to.y - arrow.from.y, arrow.to.x - arrow.from.x)
    expect((angle * 180) / Math.PI).toBeCloseTo(82, 9)
  })

  it('are its magnitude by the scale and its angle, whatever they are', () => {
    const figure = fc.double({ min: 1e-6, max: 1e6, noNaN: true })
    const degrees = fc.double({ min: -179.9, max: 180, noNaN: true })
    fc.assert(
      fc.property(figure, degrees, (magnitude, angle) => {
        const sheet = sheetOf([phasor('V1', String(magnitude), String(angle))])
        const scene = sceneOf(sheet)
        const arrow = arrowOf(scene, 'loose:V1')
        const scale = scene.unitsPerCentimetre.voltage ?? 0
        expect((lengthOf(arrow) * scale) / 10 / magnitude).toBeCloseTo(1, 9)
        const drawn = Math.atan2(arrow.to.y - arrow.from.y, arrow.to.x - arrow.from.x)
        const turn = Math.abs((drawn * 180) / Math.PI - angle)
        expect(Math.min(turn, 360 - turn)).toBeLessThan(1e-9)
      }),
    )
  })

  it('is exactly level for 0° and exactly upright for 90°', () => {
    const sheet = sheetOf([phasor('V1', '7.3', '0'), phasor('V2', '7.3', '90')])
    const scene = sceneOf(sheet)
    const [level, upright] = [arrowOf(scene, 'loose:V1'), arrowOf(scene, 'loose:V2')]
    expect(level.to.y).toBe(level.from.y)
    expect(upright.to.x).toBe(upright.from.x)
  })
})
