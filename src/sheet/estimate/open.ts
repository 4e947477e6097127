import { type Missing, missingReadings } from '../../core/estimate'
import type { Caution, PhasorEvaluation } from '../evaluation'
import type { SheetProblem } from './sheet-problem'
import type { SolvedPart, SolvedSheet } from './solved-sheet'

/** More names than these are counted, not listed. */
const MOST = 6

/** What is open in each part of a sheet, in one sentence, and which readings would fix it. */
export function openCautions(
  phasors: readonly PhasorEvaluation[],
  problem: SheetProblem,
  solved: SolvedSheet,
): readonly Caution[] {
  return solved.parts.flatMap((part) => {
    const own = part.part.phasors.flatMap((place) => phasors[place ?? -1] ?? [])
    const about = own.find(isOpen)
    if (about === undefined || part.isTooLarge) return []
    const text = sentenceOn(part, problem)
    return text === undefined ? [] : [{ about: about.id, text }]
  })
}

function isOpen({ magnitudeState, angleState, magnitude }: PhasorEvaluation): boolean {
  return magnitudeState === 'open' || (angleState === 'open' && magnitude !== 0)
}

function sentenceOn({ part }: SolvedPart, problem: SheetProblem): string | undefined {
  const asked = part.phasors.flatMap((whole, place) => (whole === undefined ? [] : [place]))
  const { open, plan } = missingReadings(part.problem, asked)
  const [first] = plan
  if (first === undefined) return undefined
  const nameOf = (phasor: number) => problem.names.phasors[part.phasors[phasor] ?? -1]?.label ?? ''
  const nothing = `Nothing fixes ${listed(namesOf(open, nameOf), 'or')}`
  if (open.length === 1) return `${nothing}: a reading of it would.`
  const readings = plan.map(({ reading }) => reading)
  if (plan.length === open.length) return `${nothing}: a reading of each would.`
  const named = listed(namesOf(readings, nameOf), 'and')
  return plan.length === 1
    ? `${nothing}: a reading of ${named} would.`
    : `${nothing}: readings of ${named} would, together.`
}

/** `the magnitude and angle of V1`, one for each phasor. */
function namesOf(
  quantities: readonly Missing[],
  nameOf: (phasor: number) => string,
): readonly string[] {
  const kinds = new Map<number, Missing['kind'][]>()
  for (const { phasor, kind } of quantities) {
    kinds.set(phasor, [...(kinds.get(phasor) ?? []), kind])
  }
  return [...kinds].map(([phasor, own]) => `the ${own.join(' and ')} of ${nameOf(phasor)}`)
}

function listed(names: readonly string[], word: 'and' | 'or'): string {
  const shown = names.length > MOST ? names.slice(0, MOST - 1) : names
  const all =
    shown.length < names.length ? [...shown, `${names.length - shown.length} more`] : shown
  const last = all.at(-1) ?? ''
  return all.length < 2 ? last : `${all.slice(0, -1).join(', ')} ${word} ${last}`
}
