import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { labelRuns } from '../../../src/drawing'

const set = (label: string) => labelRuns(label, 5).map(({ text, face }) => `${face}:${text}`)

describe('a label', () => {
  it.each([
    ['V', ['symbol:V']],
    ['Vcoil', ['symbol:V', 'sans:coil']],
    ['V_coil', ['symbol:V', 'sans:coil']],
    ['I12', ['symbol:I', 'sans:12']],
    ['φ1', ['symbol:φ', 'sans:1']],
    ['ΔV', ['symbol:Δ', 'sans:V']],
    [' VR ', ['symbol:V', 'sans:R']],
    ['É1', ['symbol:É', 'sans:1']],
    ['Supply A', ['sans:Supply A']],
    ['3-phase', ['sans:3-phase']],
    ['電圧', ['sans:電圧']],
    ['🔌1', ['sans:🔌1']],
    ['מתח', ['sans:\u2068מתח\u2069']],
    ['Vמ', ['symbol:V', 'sans:\u2068מ\u2069']],
    ['', ['sans:']],
  ])('%j is set as %j', (label, runs) => {
    expect(set(label)).toEqual(runs)
  })

  it('has its subscript smaller and lower', () => {
    const [symbol, subscript] = labelRuns('Vcoil', 5)
    expect(subscript?.size).toBeLessThan(symbol?.size ?? 0)
    expect(subscript?.rise).toBeLessThan(0)
  })

  it('never leaves a direction open, whatever is typed', () => {
    const marks = fc.constantFrom(
      '\u202a',
      '\u202e',
      '\u2066',
      '\u2067',
      '\u2068',
      '\u2069',
      '\u202c',
      'V',
      'מ',
      ' ',
    )
    fc.assert(
      fc.property(fc.array(marks), (parts) => {
        const text = labelRuns(parts.join(''), 5)
          .map((run) => run.text)
          .join('')
        expect(text).not.toMatch(/[\u202a-\u202e\u2066\u2067]/)
        let depth = 0
        for (const character of text) {
          if (character === '\u2068') depth += 1
          if (character === '\u2069') depth -= 1
          expect(depth === 0 || depth === 1).toBe(true)
        }
        expect(depth).toBe(0)
      }),
    )
  })
})
