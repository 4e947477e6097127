import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layout, type Scene, type TextItem } from '../../src/drawing'
import { type Phasor, type Quantity, quick, type Sheet, type Sum } from '../../src/sheet'
import { overlapsOf } from './overlap'
import { fan, phasor, sheetOf, sum } from './sheets'

function sceneOf(sheet: Sheet): Scene {
  return layout(sheet, quick(sheet))
}

function labelsOf(scene: Scene): TextItem[] {
  return scene.items.filter((item) => item.kind === 'text').filter(({ part }) => part === 'label')
}

function wordsOf(scene: Scene): string[] {
  return labelsOf(scene).map(({ runs }) => runs.map(({ text }) => text).join(''))
}

const MOST = 40
const magnitude = fc.double({ min: 0.01, max: 60, noNaN: true })
const angle = fc.double({ min: -179.9, max: 180, noNaN: true })
const label = fc.stringMatching(/^[A-Zφ][A-Za-z0-9]{0,7}$/)
const paper = fc.record({
  paper: fc.constantFrom('A4', 'A3', 'Letter'),
  orientation: fc.constantFrom('landscape', 'portrait'),
})

function named(
  parts: readonly { m: number; a: number; label: string; quantity?: Quantity }[],
): Phasor[] {
  return parts.map(({ m, a, label: name, quantity = 'voltage' }, index) => ({
    ...phasor(`V${index}`, m.toPrecision(3), a.toFixed(1), quantity),
    label: name,
  }))
}

const anyParts = fc.array(fc.record({ m: magnitude, a: angle, label }), {
  minLength: 1,
  maxLength: MOST,
})
const idsOf = (phasors: readonly Phasor[]) => phasors.map(({ id }) => id)

/** Families of sheets of up to forty phasors, each hard in its own way. */
const families: Record<string, fc.Arbitrary<{ phasors: Phasor[]; sums?: Sum[] }>> = {
  'tip to tail': anyParts.map((parts) => {
    const phasors = named(parts)
    return { phasors, sums: [sum('s', idsOf(phasors))] }
  }),
  'a star of forty': fc
    .array(fc.record({ m: magnitude, label }), { minLength: MOST, maxLength: MOST })
    .map((parts) => {
      const phasors = named(parts.map((part, index) => ({ ...part, a: index * 9 - 179 })))
      return { phasors, sums: [sum('s', idsOf(phasors), { arrangement: 'from-origin' })] }
    }),
  'loose, of all quantities': fc
    .array(
      fc.record({
        m: magnitude,
        a: angle,
        label,
        quantity: fc.constantFrom('voltage', 'current', 'impedance', 'power', 'other'),
      }),
      { maxLength: MOST },
    )
    .map((parts) => ({ phasors: named(parts) })),
  'all collinear': fc.tuple(anyParts, angle, fc.boolean()).map(([parts, a, isSum]) => {
    const phasors = named(parts.map((part) => ({ ...part, a })))
    return { phasors, ...(isSum && { sums: [sum('s', idsOf(phasors))] }) }
  }),
  'all identical': fc
    .tuple(magnitude, angle, label, fc.constantFrom('loose', 'tip-to-tail', 'from-origin'))
    .map(([m, a, name, arrangement]) => {
      const phasors = named(Array.from({ length: MOST }, () => ({ m, a, label: name })))
      if (arrangement === 'loose') return { phasors }
      return { phasors, sums: [sum('s', idsOf(phasors), { arrangement })] }
    }),
  'one huge, the others tiny': anyParts.map((parts) => ({
    phasors: named(parts.map((part, index) => (index === 0 ? { ...part, m: 1e6 } : part))),
  })),
  'two sums': fc.tuple(anyParts, fc.boolean()).map(([parts, isClosing]) => {
    const phasors = named(parts)
    const [first, second] = [idsOf(phasors), idsOf(phasors).reverse()]
    return {
      phasors,
      sums: [
        sum('s', first.slice(0, parts.length >> 1), { equals: first.at(-1) ?? 0 }),
        sum('t', second.slice(1, (parts.length + 1) >> 1), isClosing ? { equals: 0 } : {}),
      ].filter(({ terms }) => terms.length > 0),
    }
  }),
}

describe.each(Object.entries(families))('up to forty phasors, %s', (_, family) => {
  it('are all labelled, and no label covers anything', () => {
    fc.assert(
      fc.property(family, paper, ({ phasors, sums }, drawing) => {
        const scene = sceneOf(sheetOf(phasors, { drawing, ...(sums && { sums }) }))
        expect(overlapsOf(scene)).toEqual([])
        expect(scene.labelsLeftOut).toBe(0)
      }),
      { numRuns: 8 },
    )
  })
})

describe('at a stated scale', () => {
  it('forty phasors all over and beyond the paper are labelled where they show', () => {
    const origin = fc.record({
      x: fc.integer({ min: 20, max: 270 }),
      y: fc.integer({ min: 20, max: 190 }),
    })
    fc.assert(
      fc.property(anyParts, origin, (parts, at) => {
        const drawing = { origin: at, unitsPerCentimetre: { voltage: 2 } }
        const scene = sceneOf(sheetOf(named(parts), { drawing }))
        expect(overlapsOf(scene)).toEqual([])
        expect(scene.labelsLeftOut).toBe(0)
      }),
      { numRuns: 8 },
    )
  })

  it('forty phasors too small to see are all labelled', () => {
    const phasors = named(
      Array.from({ length: MOST }, (_, index) => ({ m: 0.001, a: index, label: `V${index}` })),
    )
    const scene = sceneOf(sheetOf(phasors, { drawing: { unitsPerCentimetre: { voltage: 100 } } }))
    expect(overlapsOf(scene)).toEqual([])
    expect(scene.labelsLeftOut).toBe(0)
  })
})

describe('beyond forty phasors', () => {
  it('what found no room is counted, and no label covers anything', () => {
    for (const count of [60, 100, 400]) {
      const phasors = named(
        Array.from({ length: count }, (_, index) => ({
          m: 5 + ((index * 37) % 50),
          a: ((index * 101) % 360) - 179,
          label: `V${index}`,
        })),
      )
      const scene = sceneOf(sheetOf(phasors, { sums: [sum('s', idsOf(phasors))] }))
      const arcs = scene.items.filter(({ part }) => part === 'angle').length
      expect(overlapsOf(scene)).toEqual([])
      // Every phasor, the resultant and its angle.
      expect(labelsOf(scene).length + scene.labelsLeftOut).toBe(count + 1 + arcs)
    }
  })
})

describe('the text of a label', () => {
  it('is symbol and value, with the digits as typed', () => {
    expect(wordsOf(sceneOf(fan))).toEqual(
      expect.arrayContaining([
        'VR\u00a018.5 V ∠ 0°',
        'Vcoil\u00a057.3 V ∠ 74.6°',
        'VC\u00a031.0 V ∠ −90°',
      ]),
    )
  })

  it('says which phasor is the reference', () => {
    expect(wordsOf(sceneOf(fan))).toContain('I\u00a01.62 A, reference')
  })

  it('tells what was calculated from what was measured, and how far apart they are', () => {
    const words = wordsOf(sceneOf(fan))
    expect(words).toContain('VS\u00a041.6 V ∠ 34.9° measured')
    expect(words.some((text) => /^VS\u00a041\.\d V ∠ \d+\.\d° calculated$/.test(text))).toBe(true)
    expect(words.some((text) => /^gap 0\.\d V, \d\.\d mm$/.test(text))).toBe(true)
  })

  it('sets the first letter as the symbol and the rest as its subscript', () => {
    const runs = labelsOf(sceneOf(fan)).find(({ arrow }) => arrow === 'term:s1:1')?.runs ?? []
    expect(runs.map(({ text, face }) => [text, face])).toEqual([
      ['V', 'symbol'],
      ['coil', 'sans'],
      ['\u00a057.3 V ∠ 74.6°', 'sans'],
    ])
    expect(runs[1]?.rise).toBeLessThan(0)
  })

  it('puts a true minus sign before a negative term', () => {
    const sheet = sheetOf([phasor('V1', '30', '20'), phasor('V2', '12', '80')], {
      sums: [sum('s', ['V1', '−V2'])],
    })
    expect(wordsOf(sceneOf(sheet))).toContain('−V2\u00a012 V ∠ 80°')
  })

  it('shows no more digits than the limit supports', () => {
    const typed = { value: 48.2137, text: '48.2137', limit: 0.5 }
    const sheet = sheetOf([{ ...phasor('V1', '48.2137', '20'), magnitude: typed }])
    expect(wordsOf(sceneOf({ ...sheet, reference: 'V1' }))).toEqual(['V1\u00a048.21 V ∠ 20°'])
  })

  it('has no angle for a magnitude of zero', () => {
    expect(wordsOf(sceneOf(sheetOf([phasor('I', '1', '0'), phasor('V2', '0', '30')])))).toContain(
      'V2\u00a00 V',
    )
  })

  it('calls a resultant by the sum’s own name where nothing is measured', () => {
    const phasors = [phasor('V1', '30', '20'), phasor('V2', '12', '80')]
    const call = (name: string) =>
      wordsOf(sceneOf(sheetOf(phasors, { sums: [sum('s', ['V1', 'V2'], { label: name })] })))
    expect(call('VAB').some((text) => text.startsWith('VAB\u00a037'))).toBe(true)
    expect(call('Whole loop').some((text) => text.startsWith('Whole loop 37'))).toBe(true)
  })
})

describe('the place of a label', () => {
  it('of a term lies outside the figure', () => {
    const phasors = [phasor('V1', '40', '0'), phasor('V2', '40', '120'), phasor('V3', '40', '-120')]
    const scene = sceneOf(sheetOf(phasors, { sums: [sum('s', ['V1', 'V2', 'V3'])] }))
    const bottom = labelsOf(scene).find(({ arrow }) => arrow === 'term:s:0')
    expect(bottom?.at.y).toBeLessThan(scene.origin.y)
  })

  it('is the same for the same sheet', () => {
    expect(sceneOf(fan)).toEqual(sceneOf(fan))
  })
})
