import { describe, expect, it } from 'vitest'
import { expectPublished, nameOf, outputOf, published, publishedCases } from './cases'

describe('the published values', () => {
  it('number 110 cases, each with its source, its status and at least one output', () => {
    expect(publishedCases).toHaveLength(110)
    for (const each of publishedCases) {
      expect(each.source, each.id).not.toBe('')
      expect(each.status, each.id).not.toBe('')
      expect(each.outputs.length, each.id).toBeGreaterThan(0)
    }
    expect(new Set(publishedCases.map((each) => each.id)).size).toBe(110)
  })

  it('agree with themselves: what is computed lies within the rounding of what is printed', () => {
    for (const each of publishedCases) {
      for (const output of each.outputs) expectPublished(output, output.computed)
    }
  })

  it('name their source and how it reached us', () => {
    expect(nameOf(published('R01'))).toMatch(
      /^R01 Two voltages in quadrature \(.*Kuphaldt.*; read at the source\)$/,
    )
  })

  it('are not met by a value that is a hundred-millionth off', () => {
    const output = outputOf(published('R01'), 'angle')
    expect(() => expectPublished(output, output.computed * (1 + 1e-8))).toThrow()
    expect(() => expectPublished(output, Number.NaN)).toThrow()
  })

  it('take an angle a whole turn away for the same, and a magnitude not', () => {
    const { outputs } = published('R01')
    const [magnitude, angle] = [outputs[0], outputs[1]]
    if (magnitude === undefined || angle === undefined) throw new Error('R01 has two outputs')
    expectPublished(angle, angle.computed - 360)
    expect(() => expectPublished(magnitude, magnitude.computed + 360)).toThrow()
  })

  it('are compared with what is printed only where the source is right', () => {
    const output = outputOf(published('W15'), 'C')
    expect(output.printed_disagrees).toBe(true)
    expectPublished(output, output.computed)
  })

  it('hold no case of another name', () => {
    expect(() => published('X99')).toThrow('X99')
    expect(() => outputOf(published('R01'), 'power')).toThrow('power')
  })
})
