import { fromPolar, toPolar } from '../../core'
import type { Drawing } from '../../core/estimate'
import type { Alternative } from '../evaluation'
import type { SheetProblem } from './sheet-problem'
import { observablesAt, type SolvedPart, type SolvedSheet } from './solved-sheet'

/** More would not fit the page, and tell nobody anything. */
const MOST = 16

/** Which drawing of each part, in every combination, the first of each first. */
function combinations(parts: readonly SolvedPart[]): readonly (readonly (Drawing | undefined)[])[] {
  let all: (readonly (Drawing | undefined)[])[] = [[]]
  for (const { estimate } of parts) {
    const drawings = estimate?.drawings ?? [undefined]
    all = drawings.flatMap((drawing) => all.map((others) => [...others, drawing])).slice(0, MOST)
  }
  return all
}

function phasorsOf(part: SolvedPart, drawing: Drawing | undefined, { names }: SheetProblem) {
  return part.part.phasors.flatMap((whole, place) => {
    const at = observablesAt(place)
    const magnitude = drawing?.find(at.magnitude)
    const angle = drawing?.find(at.angle)
    const id = names.phasors[whole ?? -1]?.id
    if (id === undefined || magnitude === undefined || angle === undefined) return []
    const value = toPolar(fromPolar(magnitude.value, angle.value))
    return [{ id, magnitude: value.magnitude, angle: angle.value, whole: whole ?? 0 }]
  })
}

/** Every drawing that the readings allow, the one that is meant first; sixteen at the most. */
export function alternativesOf(
  problem: SheetProblem,
  { parts }: SolvedSheet,
): readonly Alternative[] {
  return combinations(parts).map((drawings) => ({
    phasors: drawings
      .flatMap((drawing, each) => {
        const part = parts[each]
        return part ? phasorsOf(part, drawing, problem) : []
      })
      .sort((a, b) => a.whole - b.whole)
      .map(({ id, magnitude, angle }) => ({ id, magnitude, angle })),
  }))
}
