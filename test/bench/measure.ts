/** One line of the benchmark: what is compared, the goal, and how to find the figure. */
export interface Measure {
  /** What is compared with what. */
  readonly name: string
  /** The figure is to be at most this. */
  readonly goal: number
  /** What the figure counts, where it is no ratio. */
  readonly unit?: string
  /** Ours over theirs, both taken in this one call. */
  readonly measure: () => Promise<number>
}

/** The middle one of some figures; of an even number, the mean of the two in the middle. */
export function median(figures: readonly number[]): number {
  const sorted = [...figures].sort((a, b) => a - b)
  const middle = sorted.length / 2
  const low = sorted[Math.ceil(middle) - 1]
  const high = sorted[Math.floor(middle)]
  if (low === undefined || high === undefined) throw new Error('There is no median of nothing.')
  return (low + high) / 2
}

/** Two things to be compared: each gives its own cost, in the same unit. */
export interface Sides {
  readonly ours: () => number | Promise<number>
  readonly theirs: () => number | Promise<number>
}

/**
 * The median cost of ours over that of theirs. The two take turns, each going first every other time,
 * so that whatever slows the machine slows both. Before that come a fifth as many rounds to warm up,
 * which do not count.
 */
export async function ratioOfMedians({ ours, theirs }: Sides, rounds: number): Promise<number> {
  const costs = { ours: [] as number[], theirs: [] as number[] }
  const warmUp = Math.ceil(rounds / 5)
  for (let round = 0; round < warmUp + rounds; round += 1) {
    const order = round % 2 === 0 ? (['ours', 'theirs'] as const) : (['theirs', 'ours'] as const)
    for (const side of order) {
      const cost = await (side === 'ours' ? ours() : theirs())
      if (round >= warmUp) costs[side].push(cost)
    }
  }
  return median(costs.ours) / median(costs.theirs)
}

/** The milliseconds that a piece of work takes. */
export function millisecondsOf(work: () => unknown): number {
  const start = performance.now()
  work()
  return performance.now() - start
}
