import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { boundsOf, boundsOfAll, type Item, type Scene, svg } from '../../../src/drawing'
import {
  type TriangleKind,
  type TriangleSubject,
  triangleScene,
  triangleSubjects,
} from '../../../src/drawing/circuit'
import { quick, type Sheet } from '../../../src/sheet'
import { ballasted } from '../schematic/circuits'
import { phasor } from '../sheets'

const subject = (re: number, im: number): TriangleSubject => ({
  of: 'total',
  name: 'the whole circuit',
  basis: 'found',
  power: { re, im },
  impedance: { re, im },
})

function sceneOf(kind: TriangleKind, re: number, im: number): Scene {
  const scene = triangleScene(kind, subject(re, im), 'Extract fan 2', 'light')
  if (!scene) throw new Error('There is no triangle.')
  return scene
}

function textOf(item: Item): string {
  return item.kind === 'text' ? item.runs.map(({ text }) => text).join('') : ''
}

function textsOf({ items }: Scene): string[] {
  return items.map(textOf).filter((text) => text !== '')
}

/** Tips of the whole, the real and the imaginary part, from the start, in the unit. */
function tipsOf(scene: Scene, kind: TriangleKind): readonly (readonly [number, number])[] {
  const perMillimetre = (scene.unitsPerCentimetre[kind] ?? 0) / 10
  return scene.items.flatMap((item) => {
    if (item.part !== 'arrow' || item.kind !== 'path') return []
    const [x = 0, y = 0] = item.points
    return [[(x - scene.origin.x) * perMillimetre, (y - scene.origin.y) * perMillimetre] as const]
  })
}

describe('a triangle', () => {
  it('is drawn to its scale: the two parts, one on the other, end where the whole does', () => {
    const [whole, real, imaginary] = tipsOf(sceneOf('impedance', 13.5, -8.25), 'impedance')
    expect(whole?.[0]).toBeCloseTo(13.5, 9)
    expect(whole?.[1]).toBeCloseTo(-8.25, 9)
    expect(real?.[0]).toBeCloseTo(13.5, 9)
    expect(real?.[1]).toBeCloseTo(0, 9)
    expect(imaginary).toEqual(whole)
  })

  it('says what its sides come to, and how much 10 mm are', () => {
    expect(textsOf(sceneOf('impedance', 3, 4))).toEqual([
      'R\u00a03.000 Ω',
      'X\u00a04.000 Ω',
      'Z\u00a05.000 Ω ∠ 53.1°',
      'Impedance of the whole circuit, by the best values of the readings',
      '10 mm = 1 Ω',
    ])
    expect(textsOf(sceneOf('power', 300, -400)).slice(0, 3)).toEqual([
      'P\u00a0300.0 W',
      'Q\u00a0−400.0 var',
      'S\u00a0500.0 VA, power factor 0.600, the current leads',
    ])
  })

  it('tells power given back from power taken', () => {
    expect(textsOf(sceneOf('power', -300, 400))[0]).toBe('P\u00a0−300.0 W, given back')
    expect(textsOf(sceneOf('power', 300, 400))[0]).toBe('P\u00a0300.0 W')
  })

  it('lies on its paper with no label on another or on a side, whatever its shape', () => {
    const part = fc.oneof(fc.constant(0), fc.double({ min: -500, max: 500, noNaN: true }))
    fc.assert(
      fc.property(part, part, fc.constantFrom('impedance', 'power'), (re, im, kind) => {
        fc.pre(Math.hypot(re, im) > 1e-3)
        const scene = sceneOf(kind as TriangleKind, re, im)
        const inked = boundsOfAll(scene.items.filter(({ part }) => part !== 'paper'))
        expect(Math.min(inked.left, inked.bottom)).toBeGreaterThan(0)
        expect(inked.right).toBeLessThan(scene.width)
        expect(inked.top).toBeLessThan(scene.height)
        const texts = scene.items.filter((item) => item.kind === 'text')
        for (const [at, one] of texts.entries()) {
          const box = boundsOf(one)
          for (const other of texts.slice(at + 1)) {
            const { left, right, bottom, top } = boundsOf(other)
            const isApart =
              right <= box.left || left >= box.right || top <= box.bottom || bottom >= box.top
            expect([textOf(one), textOf(other), isApart]).toEqual([
              textOf(one),
              textOf(other),
              true,
            ])
          }
          for (const side of scene.items) {
            if (side.part !== 'arrow' || side.kind !== 'lines') continue
            const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = side.segments
            for (let step = 0; step <= 60; step += 1) {
              const x = x1 + ((x2 - x1) * step) / 60
              const y = y1 + ((y2 - y1) * step) / 60
              const isOn = x > box.left && x < box.right && y > box.bottom && y < box.top
              expect([textOf(one), isOn]).toEqual([textOf(one), false])
            }
          }
        }
      }),
      { numRuns: 150 },
    )
  })

  it('is none where there is nothing to draw', () => {
    expect(triangleScene('power', subject(0, 0), 'T', 'light')).toBeUndefined()
    const { impedance: _, ...open } = subject(1, 1)
    expect(triangleScene('impedance', open, 'T', 'light')).toBeUndefined()
  })

  it('goes out as an SVG of true millimetres', () => {
    const scene = sceneOf('power', 300, 400)
    expect(svg(scene, '{}')).toContain(`width="${scene.width}mm"`)
  })
})

describe('what triangles can be drawn of', () => {
  const measured: Sheet = {
    ...ballasted,
    phasors: ballasted.phasors.map((each) => {
      if (each.id === 'VS') return phasor('VS', '230', '30')
      if (each.id === 'I') return phasor('I', '2', '0', 'current')
      return each.id === 'VR' ? phasor('VR', '94', '0') : each
    }),
  }

  it('is the whole circuit, and each element of which voltage and current are known', () => {
    const subjects = triangleSubjects(measured, quick(measured))
    expect(subjects.map(({ of, name, basis }) => [of, name, basis])).toEqual([
      ['total', 'the whole circuit', 'found'],
      ['R1', 'Ballast', 'found'],
    ])
    const [total, ballast] = subjects
    expect(total?.power.re).toBeCloseTo(460 * Math.cos(Math.PI / 6), 9)
    expect(total?.power.im).toBeCloseTo(230, 9)
    expect(ballast?.impedance?.re).toBeCloseTo(47, 9)
    expect(ballast?.impedance?.im).toBeCloseTo(0, 9)
  })

  it('takes what the circuit predicts where readings are missing, and says so', () => {
    const comparison = [
      { phasor: 'Vm', predicted: { magnitude: 100, angle: 0 } },
      { phasor: 'IC', predicted: { magnitude: 0.5, angle: 90 } },
    ]
    const subjects = triangleSubjects(measured, { ...quick(measured), comparison })
    const capacitor = subjects.find(({ of }) => of === 'C1')
    expect(capacitor?.basis).toBe('predicted')
    expect(capacitor?.impedance?.im).toBeCloseTo(-200, 9)
  })
})
