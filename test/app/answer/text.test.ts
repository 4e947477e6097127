import { describe, expect, it } from 'vitest'
import { describeAlternative, readingLines, uncheckedNames } from '../../../src/app/answer/text'
import { nameOfReading, type Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { phasor, reads, sheetWith } from '../../sheet/estimate/sheets'

const triangle: Sheet = sheetWith({
  phasors: [phasor('V'), phasor('V1'), { ...phasor('V2'), label: 'Vcoil' }],
  sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
  readings: [reads('V', 100, 0.5, 'r1'), reads('V1', 60, 0.5, 'r2'), reads('V2', 70, 0.5, 'r3')],
})

function withAngles(one: number, other: number): Sheet {
  return {
    ...triangle,
    readings: [
      ...(triangle.readings ?? []),
      { id: 'r4', of: 'V1', kind: 'angle', shown: one, limit: 0.5 },
      { id: 'r5', of: 'V2', kind: 'angle', shown: other, limit: 0.5 },
    ],
  }
}

describe('the words of the answer', () => {
  it('call a reading by its number, its phasor and its kind', () => {
    expect(nameOfReading(triangle, 'r3')).toBe('3: Vcoil, magnitude')
    expect(nameOfReading(withAngles(43, -36), 'r4')).toBe('4: V1, angle')
    expect(nameOfReading(triangle, 'gone')).toBe('gone')
  })

  it('list how far each reading moved, in the order of the sheet where they agree', () => {
    const sheet = withAngles(43.6, -36.1)
    const lines = readingLines(sheet, evaluate(sheet))
    expect(lines.map(({ id }) => id)).toEqual(['r1', 'r2', 'r3', 'r4', 'r5'])
    for (const { moved, share, score } of lines) {
      expect(moved).toMatch(/^(not moved|[+−]?[\d.]+( V|°))$/)
      expect(share).toMatch(/^\d+ %$/)
      expect(score).toBe('')
    }
  })

  it('list the likeliest to be wrong first where they do not', () => {
    const sheet = withAngles(43.5, -30.2)
    const evaluation = evaluate(sheet)
    expect(evaluation.agreement?.verdict).toBe('disagree')
    const lines = readingLines(sheet, evaluation)
    expect(lines[0]?.id).toBe('r5')
    expect(lines[0]?.score).toMatch(/^\d+\.\d σ$/)
    const scores = lines.map(({ score }) => Number.parseFloat(score))
    expect(scores).toEqual(scores.toSorted((a, b) => b - a))
  })

  it('name the readings that nothing checks', () => {
    expect(uncheckedNames(triangle, evaluate(triangle))).toEqual([
      '1: V, magnitude',
      '2: V1, magnitude',
      '3: Vcoil, magnitude',
    ])
  })

  it('tell one drawing from the others by what it settles otherwise', () => {
    const { alternatives = [] } = evaluate(triangle)
    const [one, other] = [0, 1].map((at) => describeAlternative(triangle, alternatives, at))
    expect(one).toMatch(/^V1 at 43\.5\d*°, Vcoil at −36\.\d+°$/)
    expect(other).toMatch(/^V1 at −43\.5\d*°, Vcoil at 36\.\d+°$/)
  })
})
