import { describe, expect, it } from 'vitest'
import { layout, type Scene } from '../../../src/drawing'
import { quick, type Sheet } from '../../../src/sheet'
import { phasor, polar, sheetOf } from '../../sheet/sheets'

function sceneOf(sheet: Sheet): Scene {
  return layout(sheet, quick(sheet))
}

/** The arcs that are dashed: those of phasors whose angle is open. */
function openArcs(scene: Scene) {
  return scene.items.filter((item) => item.kind === 'arc' && item.dash !== undefined)
}

function arcOf(scene: Scene) {
  const [first] = openArcs(scene)
  if (first?.kind !== 'arc') throw new Error('no arc is drawn')
  return first
}

const magnitude = { value: 30, text: '30.0' }
const open = { ...phasor('VC'), magnitude }
const known = [polar('VA', '24', '0'), polar('VB', '48', '60')]

describe('a phasor whose magnitude is known and whose angle is not', () => {
  it('is drawn as an arc of its radius about its tail, the tip of the term before it', () => {
    const sheet = sheetOf({
      phasors: [...known, open],
      sums: [{ id: 's1', terms: [{ phasor: 'VA' }, { phasor: 'VB' }, { phasor: 'VC' }] }],
    })
    const scene = sceneOf(sheet)
    const arc = arcOf(scene)
    const before = scene.arrows.find(({ key }) => key === 'term:s1:1')
    expect(arc.centre).toEqual(before?.to)
    expect((arc.radius / 10) * (scene.unitsPerCentimetre.voltage ?? 0)).toBeCloseTo(30, 9)
  })

  it('that a sum must equal is drawn about the direction of the resultant', () => {
    const sheet = sheetOf({
      phasors: [...known, open],
      sums: [{ id: 's1', terms: [{ phasor: 'VA' }, { phasor: 'VB' }], equals: 'VC' }],
    })
    const scene = sceneOf(sheet)
    const arc = arcOf(scene)
    const resultant = scene.arrows.find(({ key }) => key === 'resultant:s1')
    expect(arc.centre).toEqual(resultant?.from)
    expect(arc.sweep).toBe(60)
    const angle = quick(sheet).sums[0]?.resultant?.angle ?? Number.NaN
    expect(arc.start + arc.sweep / 2).toBeCloseTo(angle, 9)
  })

  it('is to scale where nothing else of its quantity is drawn, and has its scale bar', () => {
    const scene = sceneOf(sheetOf({ phasors: [polar('I', '2', '0', 'current'), open] }))
    const scale = scene.unitsPerCentimetre.voltage
    expect(scale).toBe(10)
    expect(arcOf(scene).radius).toBeCloseTo(30, 9)
    const texts = scene.items.flatMap((item) =>
      item.kind === 'text' ? [item.runs.map(({ text }) => text).join('')] : [],
    )
    expect(texts).toContain('10 mm = 10 V')
    expect(texts).toContain('VC 30.0 V, angle open')
  })

  it('stays on the paper, whatever its size', () => {
    for (const size of [0.01, 30, 300, 1e6]) {
      const sheet = sheetOf({
        phasors: [...known, { ...open, magnitude: { value: size } }],
        sums: [{ id: 's1', terms: [{ phasor: 'VA' }, { phasor: 'VB' }], equals: 'VC' }],
        drawing: { unitsPerCentimetre: { voltage: 10 } },
      })
      const scene = sceneOf(sheet)
      for (const arc of openArcs(scene)) {
        if (arc.kind !== 'arc') continue
        for (let turn = 0; turn <= arc.sweep; turn += 1) {
          const radians = ((arc.start + turn) * Math.PI) / 180
          const x = arc.centre.x + arc.radius * Math.cos(radians)
          const y = arc.centre.y + arc.radius * Math.sin(radians)
          expect(x > 0 && x < scene.width && y > 0 && y < scene.height).toBe(true)
        }
      }
    }
  })

  it('has no arc once its angle is known, or while its magnitude is open too', () => {
    expect(openArcs(sceneOf(sheetOf({ phasors: [...known, polar('VC', '30', '10')] })))).toEqual([])
    expect(openArcs(sceneOf(sheetOf({ phasors: [...known, phasor('VC')] })))).toEqual([])
  })
})
