import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fan, phasor, sheetOf, sum } from '../sheets'
import { arrowOf, lengthOf, sceneOf } from './scenes'

describe('the scale and the origin', () => {
  it('are chosen so that all lies inside the frame, on whole 10 mm', () => {
    const one = fc.record({
      magnitude: fc.double({ min: 1e-12, max: 1e12, noNaN: true }),
      angle: fc.integer({ min: -179, max: 180 }),
      quantity: fc.constantFrom('voltage', 'current', 'impedance', 'power', 'other'),
    })
    const paper = fc.constantFrom('A4', 'A3', 'Letter')
    const orientation = fc.constantFrom('landscape', 'portrait')
    fc.assert(
      fc.property(fc.array(one, { maxLength: 30 }), paper, orientation, (parts, size, way) => {
        const phasors = parts.map(({ magnitude, angle, quantity }, index) =>
          phasor(`V${index}`, String(magnitude), String(angle), quantity),
        )
        const half = phasors.slice(0, phasors.length >> 1).map(({ id }) => id)
        const sheet = sheetOf(phasors, {
          drawing: { paper: size, orientation: way },
          sums: half.length > 0 ? [sum('s', half)] : [],
        })
        const scene = sceneOf(sheet)
        for (const { from, to } of scene.arrows) {
          for (const { x, y } of [from, to]) {
            expect(x).toBeGreaterThan(10)
            expect(x).toBeLessThan(scene.width - 10)
            expect(y).toBeGreaterThan(10)
            expect(y).toBeLessThan(scene.height - 10)
          }
        }
        expect(scene.origin.x % 10).toBe(0)
        expect(scene.origin.y % 10).toBe(0)
      }),
    )
  })

  it('are those of the sheet where it states them', () => {
    const drawing = { origin: { x: 43, y: 57 }, unitsPerCentimetre: { voltage: 7.5 } }
    const scene = sceneOf({ ...fan, drawing })
    expect(scene.origin).toEqual(drawing.origin)
    expect(scene.unitsPerCentimetre.voltage).toBe(7.5)
    expect(arrowOf(scene, 'term:s1:0').from).toEqual(drawing.origin)
  })

  it('of the quantities that are not drawn are not named', () => {
    expect(Object.keys(sceneOf(fan).unitsPerCentimetre).sort()).toEqual(['current', 'voltage'])
  })

  it('draw one tiny arrow among huge ones true to scale', () => {
    const sheet = sheetOf([phasor('V1', '1000', '30'), phasor('V2', '0.01', '120')])
    const scene = sceneOf(sheet)
    const ratio = lengthOf(arrowOf(scene, 'loose:V1')) / lengthOf(arrowOf(scene, 'loose:V2'))
    expect(ratio / 1e5).toBeCloseTo(1, 6)
  })

  it('stand for a sheet without phasors, and for one whose phasors are all zero', () => {
    expect(sceneOf(sheetOf([])).arrows).toHaveLength(0)
    const zero = sceneOf(sheetOf([phasor('V1', '0', '0'), phasor('V2', '0', '90')]))
    expect(zero.arrows.map(({ from, to }) => [to.x - from.x, to.y - from.y])).toEqual([
      [0, 0],
      [0, 0],
    ])
    expect(zero.unitsPerCentimetre.voltage).toBe(1)
  })

  it('stand for two thousand phasors', () => {
    const phasors = Array.from({ length: 2000 }, (_, index) =>
      phasor(`V${index}`, String(1 + (index % 97)), String((index * 7) % 180)),
    )
    const scene = sceneOf(sheetOf(phasors), {})
    expect(scene.arrows).toHaveLength(2000)
    expect(scene.labelsLeftOut).toBeGreaterThan(0)
  })
})
