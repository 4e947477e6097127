import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  type Box,
  boundsOf,
  boundsOfAll,
  type Item,
  layout,
  type Scene,
  svg,
} from '../../../src/drawing'
import { schematicScene } from '../../../src/drawing/circuit'
import { drawCircuit } from '../../../src/drawing/schematic/drawn-circuit'
import { paletteOf } from '../../../src/drawing/theme'
import { quick, type Sheet, serializeSheet } from '../../../src/sheet'
import { phasor, sheetOf } from '../sheets'
import { anyCircuit, ballasted } from './circuits'

function sceneOf(sheet: Sheet): Scene {
  const scene = schematicScene(sheet, 'light')
  if (!scene) throw new Error('There is no circuit.')
  return scene
}

function textOf(item: Item): string {
  return item.kind === 'text' ? item.runs.map(({ text }) => text).join('') : ''
}

function isMeeting(one: Box, other: Box): boolean {
  const close = 1e-6
  return (
    one.left < other.right - close &&
    other.left < one.right - close &&
    one.bottom < other.top - close &&
    other.bottom < one.top - close
  )
}

/** The boxes of straight strokes, each by itself; of other items their own. */
function inkOf(item: Item): readonly Box[] {
  if (item.kind !== 'lines') return [boundsOf(item)]
  const boxes: Box[] = []
  for (let at = 0; at + 3 < item.segments.length; at += 4) {
    const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = item.segments.slice(at, at + 4)
    boxes.push({
      left: Math.min(x1, x2) - 0.01,
      right: Math.max(x1, x2) + 0.01,
      bottom: Math.min(y1, y2) - 0.01,
      top: Math.max(y1, y2) + 0.01,
    })
  }
  return boxes
}

/** Each text that lies on another or on a wire, a symbol or an arrow, as a sentence. */
function overlapsIn({ items }: Scene): string[] {
  const drawn = items.filter(({ part }) => part === 'schematic')
  const texts = drawn.filter((item) => item.kind === 'text')
  return texts.flatMap((text, at) => [
    ...texts
      .slice(at + 1)
      .filter((other) => isMeeting(boundsOf(text), boundsOf(other)))
      .map((other) => `${textOf(text)} lies on ${textOf(other)}`),
    ...drawn
      .filter((item) => item.kind !== 'text' && textOf(text) !== 'Z')
      .filter((item) => inkOf(item).some((box) => isMeeting(boundsOf(text), box)))
      .map((item) => `${textOf(text)} lies on a ${item.kind}`),
  ])
}

describe('a schematic', () => {
  it('has no text on another, nor on a wire, a symbol or an arrow, however its groups nest', () => {
    fc.assert(
      fc.property(anyCircuit, (sheet) => {
        expect(overlapsIn(sceneOf(sheet))).toEqual([])
      }),
      { numRuns: 60 },
    )
  })

  it('lies within the box that it says it takes, and on its paper', () => {
    fc.assert(
      fc.property(anyCircuit, (sheet) => {
        const drawn = drawCircuit(sheet, paletteOf('light'))
        const { left, right, bottom, top } = boundsOfAll(drawn?.items ?? [])
        const box = drawn?.box ?? { left: 0, right: 0, bottom: 0, top: 0 }
        expect(left).toBeGreaterThanOrEqual(box.left)
        expect(right).toBeLessThanOrEqual(box.right)
        expect(bottom).toBeGreaterThanOrEqual(box.bottom)
        expect(top).toBeLessThanOrEqual(box.top)
        const scene = sceneOf(sheet)
        const ink = boundsOfAll(scene.items)
        expect([ink.left, ink.bottom]).toEqual([0, 0])
        expect([ink.right, ink.top]).toEqual([scene.width, scene.height])
      }),
      { numRuns: 60 },
    )
  })

  it('names every element once, and draws the same again', () => {
    fc.assert(
      fc.property(anyCircuit, (sheet) => {
        const scene = sceneOf(sheet)
        expect(sceneOf(sheet)).toEqual(scene)
        const texts = scene.items.map(textOf)
        for (const { id, label } of sheet.elements ?? []) {
          if (label === '') expect(texts.filter((text) => text === id)).toHaveLength(1)
        }
      }),
      { numRuns: 50 },
    )
  })

  it('gives each phasor its positive direction once, voltages closed heads and currents open ones', () => {
    const texts = sceneOf(ballasted).items.map(textOf)
    for (const label of ['VS', 'I', 'VR', 'Vmotor', 'Imain', 'IC']) {
      expect(texts.filter((text) => text === label)).toHaveLength(1)
    }
    const heads = sceneOf(ballasted).items.filter((item) => item.kind === 'path' && item.fill)
    const corners = heads.map((item) => (item.kind === 'path' ? item.points.length / 2 : 0))
    expect(corners.filter((count) => count === 3)).toHaveLength(3)
    expect(corners.filter((count) => count === 6)).toHaveLength(3)
  })

  it('shows what its elements are marked with', () => {
    const texts = sceneOf(ballasted).items.map(textOf)
    for (const value of ['47 Ω', '8.2 Ω, 150 mH', '16 µF', '50 Hz']) expect(texts).toContain(value)
    expect(sceneOf(ballasted).description).toBe(
      'Circuit: Ballast (47 Ω) in series with (Main winding (8.2 Ω, 150 mH) in parallel with Run capacitor (16 µF)).',
    )
  })

  it('stands on the sheet beside the drawing, clear of arrows and labels, and goes out with it', () => {
    const measured = {
      ...ballasted,
      phasors: ballasted.phasors.map((each) => {
        if (each.id === 'VR') return { ...phasor('VR', '61', '0'), label: 'VR' }
        if (each.id === 'Vm') return { ...phasor('Vm', '188', '38'), label: 'Vmotor' }
        return each.id === 'VS' ? { ...phasor('VS', '230', '29'), label: 'VS' } : each
      }),
    }
    const scene = layout(measured, quick(measured))
    const own = boundsOfAll(scene.items.filter(({ part }) => part === 'schematic'))
    expect(own.right - own.left).toBeGreaterThan(40)
    const beside = scene.items.filter(({ part }) => part === 'label' || part === 'title-block')
    expect(beside.filter((item) => isMeeting(own, boundsOf(item)))).toEqual([])
    for (const { from, to } of scene.arrows) {
      for (let step = 0; step <= 100; step += 1) {
        const x = from.x + ((to.x - from.x) * step) / 100
        const y = from.y + ((to.y - from.y) * step) / 100
        const isInside = x > own.left && x < own.right && y > own.bottom && y < own.top
        expect(isInside).toBe(false)
      }
    }
    expect(svg(scene, serializeSheet(measured))).toContain('>Run capacitor</text>')
    expect(scene.description).toContain('Circuit: Ballast (47 Ω) in series with')
  })

  it('is left out, and the scene says so, where the sheet has no room for it', () => {
    const elements = Array.from({ length: 40 }, (_, at) => ({
      id: `e${at}`,
      kind: 'resistor' as const,
      voltage: 'V',
      current: 'I',
    }))
    const long = sheetOf([phasor('V', '10', '0'), phasor('I', '1', '0', 'current')], {
      elements,
      circuit: { series: elements.map(({ id }) => ({ element: id })) },
    })
    const scene = layout(long, quick(long))
    expect(scene.isSchematicLeftOut).toBe(true)
    expect(scene.items.filter(({ part }) => part === 'schematic')).toEqual([])
    expect(sceneOf(long).width).toBeGreaterThan(300)
  })

  it('is nothing on a sheet without a circuit', () => {
    const bare = sheetOf([phasor('V', '10', '0')])
    expect(schematicScene(bare, 'light')).toBeUndefined()
    expect(layout(bare, quick(bare)).items.some(({ part }) => part === 'schematic')).toBe(false)
  })
})
