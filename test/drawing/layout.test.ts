import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type LayoutOptions, layout, type PlacedArrow, type Scene } from '../../src/drawing'
import { quick, type Sheet } from '../../src/sheet'
import { fan, phasor, sheetOf, sum } from './sheets'

function sceneOf(sheet: Sheet, options: LayoutOptions = { labels: false }): Scene {
  return layout(sheet, quick(sheet), options)
}

function arrowOf(scene: Scene, key: string): PlacedArrow {
  const arrow = scene.arrows.find((each) => each.key === key)
  if (!arrow) throw new Error(`There is no arrow ${key}.`)
  return arrow
}

function lengthOf({ from, to }: PlacedArrow): number {
  return Math.hypot(to.x - from.x, to.y - from.y)
}

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

  it('is set off 8 mm below an arrow along which it would lie', () => {
    const scene = sceneOf(fan)
    const [first, current] = [arrowOf(scene, 'term:s1:0'), arrowOf(scene, 'loose:I')]
    expect(current.from.x).toBeCloseTo(first.from.x, 9)
    expect(current.from.y).toBeCloseTo(first.from.y - 8, 9)
    expect(scene.starts.get('loose:I')).toEqual(current.from)
  })

  it('is set off a step for each of several that are alike', () => {
    const phasors = ['V1', 'V2', 'V3'].map((id) => phasor(id, '48.2', '30'))
    const scene = sceneOf(sheetOf(phasors))
    const starts = scene.arrows.map(({ from }) => `${from.x.toFixed(3)} ${from.y.toFixed(3)}`)
    expect(new Set(starts).size).toBe(3)
  })
})

describe('figures of one quantity', () => {
  it('do not overlap', () => {
    const term = fc.record({
      magnitude: fc.double({ min: 0.1, max: 100, noNaN: true }),
      angle: fc.integer({ min: -179, max: 180 }),
    })
    const figures = fc.array(fc.array(term, { minLength: 1, maxLength: 4 }), {
      minLength: 2,
      maxLength: 6,
    })
    fc.assert(
      fc.property(figures, (sums) => {
        const phasors = sums.flatMap((terms, s) =>
          terms.map(({ magnitude, angle }, t) =>
            phasor(`V${s}x${t}`, String(magnitude), String(angle)),
          ),
        )
        const scene = sceneOf(
          sheetOf(phasors, {
            sums: sums.map((terms, s) =>
              sum(
                `s${s}`,
                terms.map((_, t) => `V${s}x${t}`),
              ),
            ),
          }),
        )
        const boxes = sums.map((_, s) =>
          boxOf(scene.arrows.filter((arrow) => arrow.sum === `s${s}`)),
        )
        for (const [index, one] of boxes.entries()) {
          for (const other of boxes.slice(index + 1)) expect(isApart(one, other)).toBe(true)
        }
      }),
    )
  })
})

function boxOf(arrows: readonly PlacedArrow[]): [number, number, number, number] {
  const xs = arrows.flatMap(({ from, to }) => [from.x, to.x])
  const ys = arrows.flatMap(({ from, to }) => [from.y, to.y])
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)]
}

function isApart(one: readonly number[], other: readonly number[]): boolean {
  const [left = 0, bottom = 0, right = 0, top = 0] = one
  const [left2 = 0, bottom2 = 0, right2 = 0, top2 = 0] = other
  return right < left2 || right2 < left || top < bottom2 || top2 < bottom
}

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
