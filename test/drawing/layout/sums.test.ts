import { describe, expect, it } from 'vitest'
import type { Sheet } from '../../../src/sheet'
import { fan, phasor, sheetOf, sum } from '../sheets'
import { arrowOf, sceneOf } from './scenes'

describe('a sum tip to tail', () => {
  it('starts each term on the tip of the one before', () => {
    const scene = sceneOf(fan)
    expect(arrowOf(scene, 'term:s1:1').from).toEqual(arrowOf(scene, 'term:s1:0').to)
    expect(arrowOf(scene, 'term:s1:2').from).toEqual(arrowOf(scene, 'term:s1:1').to)
  })

  it('ends where its exact resultant ends', () => {
    const scene = sceneOf(fan)
    const [last, resultant] = [arrowOf(scene, 'term:s1:2'), arrowOf(scene, 'resultant:s1')]
    expect(resultant.from).toEqual(arrowOf(scene, 'term:s1:0').from)
    expect(resultant.to.x).toBeCloseTo(last.to.x, 9)
    expect(resultant.to.y).toBeCloseTo(last.to.y, 9)
  })

  it('draws what was measured from its start', () => {
    const scene = sceneOf(fan)
    const measured = arrowOf(scene, 'measured:s1')
    expect(measured.from).toEqual(arrowOf(scene, 'resultant:s1').from)
    expect(measured.phasor).toBe('VS')
  })

  it('draws a negative term reversed', () => {
    const sheet = sheetOf([phasor('V1', '30', '20'), phasor('V2', '12', '80')], {
      sums: [sum('s', ['V1', '−V2'])],
    })
    const arrow = arrowOf(sceneOf(sheet), 'term:s:1')
    expect(arrow.sign).toBe(-1)
    const angle = Math.atan2(arrow.to.y - arrow.from.y, arrow.to.x - arrow.from.x)
    expect((angle * 180) / Math.PI).toBeCloseTo(-100, 9)
  })

  it('leaves out a term whose angle is open, and then has no resultant', () => {
    const open = { id: 'V2', label: 'V2', quantity: 'voltage', magnitude: { value: 3 } } as const
    const sheet = sheetOf([phasor('V1', '30', '20'), open, phasor('V3', '12', '80')], {
      sums: [sum('s', ['V1', 'V2', 'V3'])],
    })
    const scene = sceneOf(sheet)
    expect(scene.arrows.map(({ key }) => key)).toEqual(['term:s:0', 'term:s:2'])
    expect(arrowOf(scene, 'term:s:2').from).toEqual(arrowOf(scene, 'term:s:0').to)
  })

  it('starts where the sheet says', () => {
    const start = { x: 61, y: 83 }
    const sheet = { ...fan, sums: [sum('s1', ['VR', 'VL', 'VC'], { start })] }
    expect(arrowOf(sceneOf(sheet), 'term:s1:0').from).toEqual(start)
  })
})

describe('a sum from one origin', () => {
  it('starts every term at the origin', () => {
    const names = ['VR', 'VL', 'VC']
    const sheet = { ...fan, sums: [sum('s1', names, { arrangement: 'from-origin' })] }
    const scene = sceneOf(sheet)
    for (const key of ['term:s1:0', 'term:s1:1', 'term:s1:2', 'resultant:s1']) {
      expect(arrowOf(scene, key).from).toEqual(scene.origin)
    }
  })
})

describe('the gap of a sum', () => {
  const gapsOf = (sheet: Sheet) => sceneOf(sheet).items.filter(({ part }) => part === 'gap')

  it('is a bar from the calculated tip to the measured one', () => {
    const scene = sceneOf(fan)
    const [gap] = scene.items.filter(({ part }) => part === 'gap')
    const [calculated, measured] = [arrowOf(scene, 'resultant:s1'), arrowOf(scene, 'measured:s1')]
    expect(gap?.kind).toBe('lines')
    expect(gap?.arrow).toBe('resultant:s1')
    const { x, y } = calculated.to
    const bar = [x, y, measured.to.x, measured.to.y]
    expect(gap?.kind === 'lines' && gap.segments.slice(0, 4)).toEqual(bar)
  })

  it('of a sum that must close reaches from its start to its last tip, and no resultant is drawn', () => {
    const phasors = [phasor('I1', '4', '0', 'current'), phasor('I2', '3.8', '180', 'current')]
    const scene = sceneOf(sheetOf(phasors, { sums: [sum('s', ['I1', 'I2'], { equals: 0 })] }))
    const resultant = arrowOf(scene, 'resultant:s')
    const gap = scene.items.find(({ part }) => part === 'gap')
    const { from, to } = resultant
    expect(gap?.kind === 'lines' && gap.segments.slice(0, 4)).toEqual([from.x, from.y, to.x, to.y])
    const drawn = scene.items.filter(({ part }) => part === 'arrow').map(({ arrow }) => arrow)
    expect(drawn).not.toContain(resultant.key)
  })

  it('is not drawn where the sum is exactly what was measured', () => {
    const phasors = [phasor('V1', '3', '0'), phasor('V2', '4', '90')]
    const whole = {
      id: 'VS',
      label: 'VS',
      quantity: 'voltage',
      real: { value: 3 },
      imaginary: { value: 4 },
    } as const
    expect(
      gapsOf(sheetOf([...phasors, whole], { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] })),
    ).toHaveLength(0)
  })

  it('is not drawn where nothing says what the sum must equal', () => {
    expect(gapsOf({ ...fan, sums: [sum('s1', ['VR', 'VL', 'VC'])] })).toHaveLength(0)
  })
})
