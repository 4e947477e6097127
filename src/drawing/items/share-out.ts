/**
 * Shares a width out among columns: each gets what it needs, and the same of what is left over. Where
 * there is too little, the widest are cut to one width and the narrow ones keep theirs.
 */
export function shareOut(width: number, needs: readonly number[]): number[] {
  const largest = widestThatFits(width, needs)
  const given = needs.map((need) => Math.min(need, largest))
  const left = width - given.reduce((sum, each) => sum + each, 0)
  return given.map((each) => each + left / needs.length)
}

function widestThatFits(width: number, needs: readonly number[]): number {
  const rising = needs.toSorted((one, other) => one - other)
  let room = width
  for (const [index, need] of rising.entries()) {
    const share = room / (rising.length - index)
    if (need > share) return share
    room -= need
  }
  return width
}
