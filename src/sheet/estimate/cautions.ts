import type { Caution, PhasorEvaluation } from '../evaluation'
import { openCautions } from './open'
import type { SheetProblem } from './sheet-problem'
import type { SolvedPart, SolvedSheet } from './solved-sheet'

function labelOf(place: number | undefined, { names }: SheetProblem): string | undefined {
  return place === undefined ? undefined : names.phasors[place]?.label
}

function phasorsIn({ part }: SolvedPart, problem: SheetProblem): string {
  return part.phasors.flatMap((place) => labelOf(place, problem) ?? []).join(', ')
}

function idIn({ part }: SolvedPart, { names }: SheetProblem): string {
  return names.phasors[part.phasors[0] ?? -1]?.id ?? 'sheet'
}

function cautionsOfPart(solved: SolvedPart, problem: SheetProblem): readonly Caution[] {
  const about = idIn(solved, problem)
  const phasors = phasorsIn(solved, problem)
  if (solved.isTooLarge) {
    return [
      {
        about,
        text: 'Too many phasors hang together here to be adjusted: they are shown as they were read.',
      },
    ]
  }
  const drawing = solved.estimate?.drawings[0]
  if (drawing === undefined) return []
  if (solved.estimate?.isSoftened || (drawing.candidate.isFolded && !solved.estimate?.agrees)) {
    return [
      {
        about,
        text: `The values of ${phasors} contradict each other outright: no diagram can have them all. The nearest one is shown.`,
      },
    ]
  }
  if (!drawing.isPropagatedByDraws) return []
  return [
    {
      about,
      text: `Small errors change the diagram of ${phasors} out of proportion: its limits come from many random draws.`,
    },
  ]
}

/** What whoever reads the answer should know. */
export function cautionsOf(
  phasors: readonly PhasorEvaluation[],
  problem: SheetProblem,
  solved: SolvedSheet,
): readonly Caution[] {
  return [
    ...solved.parts.flatMap((part) => cautionsOfPart(part, problem)),
    ...openCautions(phasors, problem, solved),
  ]
}
