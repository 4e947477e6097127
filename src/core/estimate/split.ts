import type { Observable, PhasorProblem } from './phasor-problem'

/** A part of a problem that nothing ties to the rest, and what its phasors and elements are in the whole. */
export interface ProblemPart {
  readonly problem: PhasorProblem
  /** By place in the part: the place in the whole. The last phasor may be the part's own axis, undefined. */
  readonly phasors: readonly (number | undefined)[]
  readonly elements: readonly number[]
  readonly observations: readonly number[]
}

function phasorsOf(of: Observable, problem: PhasorProblem): readonly number[] {
  if ('element' in of) {
    const element = problem.elements[of.element]
    return element ? [element.voltage, element.current] : []
  }
  if ('voltage' in of) return [of.voltage, of.current]
  return 'against' in of && of.against !== undefined ? [of.phasor, of.against] : [of.phasor]
}

/** Groups of things that are tied together, directly or through others. */
class Ties {
  readonly #parents: number[]

  constructor(count: number) {
    this.#parents = Array.from({ length: count }, (_, each) => each)
  }

  groupOf(each: number): number {
    let root = each
    while (this.#parents[root] !== root) root = this.#parents[root] ?? root
    this.#parents[each] = root
    return root
  }

  tie(members: readonly number[]): void {
    const [first, ...others] = members
    if (first === undefined) return
    for (const other of others) this.#parents[this.groupOf(other)] = this.groupOf(first)
  }
}

/** An angle against the reference, whose own angle is given, is one from the axis: it ties nothing. */
function fromAxis(of: Observable, { reference }: PhasorProblem): Observable | undefined {
  if (of.kind !== 'angle' || reference === undefined || of.against !== reference.phasor) {
    return undefined
  }
  return { kind: 'angle', phasor: of.phasor }
}

function normalised(problem: PhasorProblem): PhasorProblem {
  const turn = problem.reference?.angle ?? 0
  return {
    ...problem,
    observations: problem.observations.map((each) => {
      const of = fromAxis(each.of, problem)
      return of === undefined ? each : { ...each, of, value: each.value + turn }
    }),
  }
}

function ties(problem: PhasorProblem): Ties {
  const errors = problem.phasors
  const found = new Ties(problem.phasors + problem.sharedErrors.length)
  for (const sum of problem.sums) found.tie(sum.map(({ phasor }) => phasor))
  for (const { voltage, current } of problem.elements) {
    const frequency = problem.frequencyError ? [errors + problem.frequencyError.error] : []
    found.tie([voltage, current, ...frequency])
  }
  for (const { of, shared } of problem.observations) {
    const common = (shared ?? []).map(({ error }) => errors + error)
    found.tie([...phasorsOf(of, problem), ...common])
  }
  return found
}

/** What a part without the reference counts its angles from: a phasor of its own, 1 at 0°, exact. */
function axisOf(phasor: number) {
  return [
    { of: { kind: 'real', phasor } as const, value: 1, parts: [] },
    { of: { kind: 'imaginary', phasor } as const, value: 0, parts: [] },
  ]
}

/** The same thing, by the places that things have in a part. */
function placed(
  of: Observable,
  phasor: (old: number) => number,
  element: (old: number) => number,
): Observable {
  switch (of.kind) {
    case 'magnitude':
    case 'real':
    case 'imaginary':
      return { ...of, phasor: phasor(of.phasor) }
    case 'angle':
      return of.against === undefined
        ? { ...of, phasor: phasor(of.phasor) }
        : { ...of, phasor: phasor(of.phasor), against: phasor(of.against) }
    case 'sine':
      return { ...of, phasor: phasor(of.phasor), against: phasor(of.against) }
    case 'power':
    case 'reactive-power':
    case 'power-factor':
      return { ...of, voltage: phasor(of.voltage), current: phasor(of.current) }
    default:
      return { ...of, element: element(of.element) }
  }
}

/** The places in the whole of what belongs to a group, and the way back. */
function membersOf(count: number, isMember: (each: number) => boolean) {
  const members = Array.from({ length: count }, (_, each) => each).filter(isMember)
  const places = new Map(members.map((each, place) => [each, place]))
  return { members, place: (old: number) => places.get(old) ?? 0 }
}

function partOf(problem: PhasorProblem, tied: Ties, group: number): ProblemPart {
  const isIn = (phasor: number | undefined) =>
    phasor !== undefined && tied.groupOf(phasor) === group
  const phasors = membersOf(problem.phasors, isIn)
  const elements = membersOf(problem.elements.length, (each) =>
    isIn(problem.elements[each]?.voltage),
  )
  const errors = membersOf(problem.sharedErrors.length, (each) => isIn(problem.phasors + each))
  const observations = problem.observations.flatMap(({ of }, each) =>
    isIn(phasorsOf(of, problem)[0]) ? [each] : [],
  )
  const hasReference = isIn(problem.reference?.phasor)
  const axis = phasors.members.length
  const { reference, frequencyError, ...common } = problem
  const error = frequencyError && isIn(problem.phasors + frequencyError.error)
  return {
    phasors: hasReference ? phasors.members : [...phasors.members, undefined],
    elements: elements.members,
    observations,
    problem: {
      ...common,
      phasors: hasReference ? axis : axis + 1,
      reference:
        hasReference && reference
          ? { phasor: phasors.place(reference.phasor), angle: reference.angle }
          : { phasor: axis, angle: 0 },
      sums: problem.sums
        .filter((sum) => isIn(sum[0]?.phasor))
        .map((sum) => sum.map((term) => ({ ...term, phasor: phasors.place(term.phasor) }))),
      elements: elements.members.flatMap((each) => {
        const element = problem.elements[each]
        if (element === undefined) return []
        const [voltage, current] = [phasors.place(element.voltage), phasors.place(element.current)]
        return [{ ...element, voltage, current }]
      }),
      sharedErrors: errors.members.flatMap((each) => problem.sharedErrors[each] ?? []),
      ...(error && frequencyError
        ? { frequencyError: { ...frequencyError, error: errors.place(frequencyError.error) } }
        : {}),
      observations: [
        ...observations.flatMap((each) => {
          const observation = problem.observations[each]
          if (observation === undefined) return []
          const of = placed(observation.of, phasors.place, elements.place)
          const shared = (observation.shared ?? []).map((part) => ({
            ...part,
            error: errors.place(part.error),
          }))
          return [{ ...observation, of, shared }]
        }),
        ...(hasReference ? [] : axisOf(axis)),
      ],
    },
  }
}

/**
 * The parts of a problem that nothing ties together: no sum, no element, no reading of one against
 * the other, no shared error. Each is solved by itself, so that a large sheet costs no more than its
 * largest part. An angle against the reference ties nothing, since the reference's is given.
 */
export function splitProblem(whole: PhasorProblem): readonly ProblemPart[] {
  const problem = normalised(whole)
  const tied = ties(problem)
  const groups = new Set<number>()
  for (let phasor = 0; phasor < problem.phasors; phasor++) groups.add(tied.groupOf(phasor))
  return [...groups].map((group) => partOf(problem, tied, group))
}
