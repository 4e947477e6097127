import { describe, expect, test } from 'vitest'
import { median, ratioOfMedians } from './measure'

describe('the benchmark', () => {
  test('takes the middle figure, and of an even number the mean of the middle two', () => {
    expect(median([9, 1, 2])).toBe(2)
    expect(median([9, 1, 2, 4])).toBe(3)
    expect(() => median([])).toThrow('no median')
  })

  test('lets the two sides take turns, and does not count the warm-up', async () => {
    const turns: string[] = []
    const costs = [1000, 3, 3, 90]
    const ratio = await ratioOfMedians(
      {
        ours: () => {
          turns.push('ours')
          return costs[turns.filter((side) => side === 'ours').length - 1] ?? Number.NaN
        },
        theirs: () => {
          turns.push('theirs')
          return 2
        },
      },
      3,
    )
    expect(ratio).toBe(1.5)
    expect(turns.join(' ')).toBe('ours theirs theirs ours ours theirs theirs ours')
  })
})
