import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { type Evaluation, parseSheetText, quick, type Sheet } from '../../src/sheet'
import { expectPublished, nameOf, outputOf, published } from './cases'

/** What of an evaluation a published figure is beside: a part of a phasor, or of a sum's resultant. */
type Part = 'magnitude' | 'angle' | 'real' | 'imaginary'
type Where = readonly [id: string, part: Part]

/** A sum of figures as printed, which must close as far as their rounding allows. */
interface Closure {
  readonly sum: string
  /** By phasor: the outputs that were rounded, its magnitude and its angle. What is exact is left out. */
  readonly rounded: { readonly [phasor: string]: readonly [magnitude?: string, angle?: string] }
}

interface Check {
  readonly figures?: { readonly [output: string]: Where }
  readonly closures?: readonly Closure[]
}

const polarOf = (
  id: string,
  magnitude: string,
  angle: string,
): { readonly [output: string]: Where } => ({
  [magnitude]: [id, 'magnitude'],
  [angle]: [id, 'angle'],
})

/** Which figures of which case the sheet of that case must give. */
const CHECKS: { readonly [id: string]: Check } = {
  R01: { figures: polarOf('s1', '|E|', 'angle') },
  R02: { figures: polarOf('s1', '|E|', 'angle') },
  R04: {
    figures: {
      ...polarOf('s1', '|E|', 'angle'),
      Re: ['s1', 'real'],
      Im: ['s1', 'imaginary'],
    },
  },
  R07: { figures: polarOf('s1', 'peak', 'angle') },
  R08: { figures: polarOf('s1', 'peak', 'angle') },
  R09: { figures: polarOf('s1', 'peak', 'angle') },
  R13: { figures: polarOf('s1', 'peak', 'angle') },
  R14: { figures: polarOf('s1', 'peak', 'angle') },
  S13: {
    closures: [{ sum: 's1', rounded: { ER: ['|ER|', 'I angle'], EL: ['|EL|', 'EL angle'] } }],
  },
  S20: { figures: polarOf('s1', 'V', 'angle') },
  S22: {
    figures: {
      'Re V': ['s1', 'real'],
      'Im V': ['s1', 'imaginary'],
      angle: ['s1', 'angle'],
    },
  },
  P01: {
    figures: {
      IR: ['IR', 'magnitude'],
      '|IL|': ['IL', 'magnitude'],
      ...polarOf('s1', '|I|', 'I angle'),
    },
  },
  P02: { figures: { '|IC|': ['IC', 'magnitude'], ...polarOf('s1', '|I|', 'I angle') } },
  P04: {
    closures: [
      { sum: 's1', rounded: { EC1: ['|EC1|', 'EC1 angle'], ER: ['|ER|', 'ER angle'] } },
      {
        sum: 's2',
        rounded: {
          EL: ['|EL|', 'EL angle'],
          EC2: ['|EC2|', 'EC2 angle'],
          ER: ['|ER|', 'ER angle'],
        },
      },
      {
        sum: 's3',
        rounded: { IR: ['|IR|', 'ER angle'], ILC: ['|ILC|', 'ILC angle'], I: ['|I|', 'I angle'] },
      },
    ],
  },
  P08: {
    figures: { 'Re I': ['s1', 'real'], 'Im I': ['s1', 'imaginary'], angle: ['s1', 'angle'] },
  },
  P09: {
    figures: {
      ...polarOf('s1', '|I|', 'I angle'),
      ...polarOf('I1', '|I1|', 'I1 angle'),
      ...polarOf('I2', '|I2|', 'I2 angle'),
    },
  },
  P11: {
    closures: [
      {
        sum: 's1',
        rounded: { Icoil: ['|Icoil|', 'Icoil angle'], IC: ['|IC|'], I: ['|I|', 'I angle'] },
      },
    ],
  },
  P14: {
    figures: {
      ...polarOf('V', '|V|', 'V angle'),
      ...polarOf('I1', '|I1|', 'I1 angle'),
      ...polarOf('I2', '|I2|', 'I2 angle'),
      ...polarOf('I3', '|I3|', 'I3 angle'),
    },
    closures: [{ sum: 's1', rounded: {} }],
  },
  W14: { figures: polarOf('s1', '|I|', 'I angle') },
  T02: { figures: { 'I phase': ['Iab', 'magnitude'], 'I line': ['s1', 'magnitude'] } },
  T06: {
    figures: {
      'I RY': ['RY', 'magnitude'],
      IR: ['IR', 'magnitude'],
      IY: ['IY', 'magnitude'],
      IB: ['IB', 'magnitude'],
    },
  },
  T12: { figures: { 'VRY angle': ['VRY', 'angle'], 'VYB angle': ['VYB', 'angle'] } },
  T13: {
    figures: {
      ...polarOf('IR', 'I line', 'IR angle'),
      'IY angle': ['IY', 'angle'],
      'IB angle': ['IB', 'angle'],
    },
  },
  T18: {
    figures: {
      'IB open': ['IBo', 'magnitude'],
      'IN open as printed': ['s1', 'magnitude'],
      'IB short': ['IBs', 'magnitude'],
      'IA short': ['s2', 'magnitude'],
    },
  },
  T20: {
    figures: {
      ...polarOf('s2', '|Ia|', 'Ia angle'),
      ...polarOf('Ib', '|Ib|', 'Ib angle'),
      ...polarOf('Ic', '|Ic|', 'Ic angle'),
    },
  },
  T21: {
    figures: {
      ...polarOf('s1', '|VAN|', 'VAN angle'),
      ...polarOf('s2', '|Van|', 'Van angle'),
      ...polarOf('s3', '|VAB|', 'VAB angle'),
    },
  },
  T22: {
    figures: {
      '|I_AB|': ['IAB', 'magnitude'],
      '|I_CA|': ['ICA', 'magnitude'],
      ...polarOf('s1', '|Ia|', 'Ia angle'),
    },
  },
  T23: { figures: { '|Ia|': ['Ia', 'magnitude'], ...polarOf('s1', '|In|', 'In angle') } },
  T24: {
    figures: {
      '|I|': ['s1', 'magnitude'],
      ...polarOf('I1', '|I1|', 'I1 angle'),
      ...polarOf('I2', '|I2|', 'I2 angle'),
    },
    closures: [{ sum: 's1', rounded: {} }],
  },
  K01: {
    figures: {
      ...polarOf('sA', '|IA|', 'IA angle'),
      ...polarOf('sB', '|IB|', 'IB angle'),
      ...polarOf('sC', '|IC|', 'IC angle'),
    },
  },
  Q13: {
    figures: {
      ...polarOf('Va', '|Va|', 'Va angle'),
      ...polarOf('Vb', '|Vb|', 'Vb angle'),
      ...polarOf('Vc', '|Vc|', 'Vc angle'),
    },
  },
  Q14: { figures: { '|In|': ['In', 'magnitude'] } },
}

const folder = new URL('sheets/', import.meta.url)

function sheetOfCase(id: string): Sheet {
  const parsed = parseSheetText(readFileSync(new URL(`${id}.json`, folder), 'utf8'))
  if (!parsed.ok) throw new Error(`${id}: ${JSON.stringify(parsed.errors)}`)
  return parsed.sheet
}

/** Units of an output in one of ours: V, A, Ω, a degree. */
const PER_UNIT: { readonly [unit: string]: number } = { mA: 1000, rad: Math.PI / 180 }

function figureIn(evaluation: Evaluation, [id, part]: Where): number {
  const phasor = evaluation.phasors.find((value) => value.id === id)
  const sum = evaluation.sums.find((value) => value.id === id)
  const figure = (phasor ?? sum?.resultant)?.[part]
  if (figure === undefined) throw new Error(`${id} has no ${part}`)
  return figure
}

/** How far a sum of rounded figures may be from closing: every figure at the end of its rounding. */
function allowedGap(id: string, { rounded }: Closure, evaluation: Evaluation): number {
  const tolerance = (name: string | undefined): number => {
    if (name === undefined) return 0
    const { unit, tol_rounding: half } = outputOf(published(id), name)
    return half / (PER_UNIT[unit] ?? 1)
  }
  return Object.entries(rounded).reduce((allowed, [phasor, [magnitude, angle]]) => {
    const along = tolerance(magnitude)
    const across = (tolerance(angle) * Math.PI) / 180
    return allowed + along + figureIn(evaluation, [phasor, 'magnitude']) * across
  }, 0)
}

test('every sheet has a check, and every check a sheet', () => {
  const sheets = readdirSync(folder).map((file) => file.replace('.json', ''))
  expect(sheets.sort()).toEqual(Object.keys(CHECKS).sort())
})

describe.each(Object.entries(CHECKS))('the sheet of %s', (id, { figures = {}, closures = [] }) => {
  const from = published(id)
  const evaluation = quick(sheetOfCase(id))

  test(`names the case, its source and how it reached us: ${nameOf(from)}`, () => {
    const { title, job } = sheetOfCase(id)
    expect(title).toBe(`${id} ${from.title}`)
    expect(job?.notes).toContain(`${from.source} (${from.status})`)
  })

  test.each(Object.entries(figures))(`gives %s as published`, (name, where) => {
    const output = outputOf(from, name)
    expectPublished(output, figureIn(evaluation, where) * (PER_UNIT[output.unit] ?? 1))
  })

  test.each(closures)('closes in $sum within the rounding of the figures', (closure) => {
    const gap = evaluation.sums.find((sum) => sum.id === closure.sum)?.closingError
    const longest = Math.max(...evaluation.phasors.map(({ magnitude = 0 }) => magnitude))
    expect(gap?.magnitude).toBeLessThanOrEqual(
      allowedGap(id, closure, evaluation) + 1e-14 * longest,
    )
  })
})

test('swapped leads are the same as a term taken off (R02)', () => {
  const [first, second] = quick(sheetOfCase('R02')).sums
  expect(second?.resultant?.magnitude).toBeCloseTo(first?.resultant?.magnitude ?? 0, 12)
  expect(second?.resultant?.angle).toBeCloseTo(first?.resultant?.angle ?? 0, 12)
})
