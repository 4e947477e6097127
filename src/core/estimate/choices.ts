import { fromPolar } from '..'
import { type Clues, clampedArc } from './clues'
import type { Draft } from './draft'
import { circlesMeet, lineMeetsCircle, linesMeet } from './geometry'
import type { ClosedSum, PhasorIndex, PhasorProblem } from './phasor-problem'

/** Several ways to go on; each changes the draft that it is given. */
export type Choice = readonly ((draft: Draft) => void)[]

/** The next question about a draft that has a few answers; nothing where only a guess helps. */
export function choiceOf(draft: Draft, problem: PhasorProblem, clues: Clues): Choice | undefined {
  return choiceOfSums(draft, problem) ?? choiceOfPowers(draft, clues) ?? choiceOfSines(draft, clues)
}

function choiceOfSums(draft: Draft, problem: PhasorProblem): Choice | undefined {
  for (const sum of problem.sums) {
    const open = draft.openTerms(sum)
    const [first, second] = open
    if (open.length !== 2 || first === undefined || second === undefined) continue
    const choice = twoTerms(draft, sum, first, second) ?? twoTerms(draft, sum, second, first)
    if (choice !== undefined && choice.length > 0) return choice
  }
  return undefined
}

function twoTerms(
  known: Draft,
  sum: ClosedSum,
  first: ClosedSum[number],
  second: ClosedSum[number],
): Choice | undefined {
  const gap = known.gap(sum, [first.phasor, second.phasor])
  const [a, b] = [known.magnitudes[first.phasor], known.magnitudes[second.phasor]]
  const [alpha, beta] = [known.angles[first.phasor], known.angles[second.phasor]]
  if (a !== undefined && b !== undefined) {
    return circlesMeet(a, b, gap).map((tip) => (draft) => {
      draft.setPhasor(first.phasor, { re: first.sign * tip.re, im: first.sign * tip.im })
    })
  }
  if (alpha !== undefined && b !== undefined) {
    const lengths = lineMeetsCircle(fromPolar(first.sign, alpha), gap, b)
    return lengths.map((length) => (draft) => draft.setMagnitude(first.phasor, length))
  }
  if (alpha === undefined || beta === undefined) return undefined
  const factors = linesMeet(fromPolar(first.sign, alpha), fromPolar(second.sign, beta), gap)
  if (factors === undefined) return undefined
  return [
    (draft) => {
      draft.setMagnitude(first.phasor, factors[0])
      draft.setMagnitude(second.phasor, factors[1])
    },
  ]
}

function choiceOfPowers(draft: Draft, clues: Clues): Choice | undefined {
  for (const { voltage, current, power, reactive, factor } of clues.powers) {
    if (draft.isRelated(voltage, current)) continue
    const [v, i] = [draft.magnitudes[voltage], draft.magnitudes[current]]
    const apparent = v === undefined || i === undefined ? undefined : v * i
    const cosine = factor ?? (power !== undefined && apparent ? power / apparent : undefined)
    if (cosine !== undefined) {
      const lead = clampedArc(Math.acos, cosine)
      return eitherAngle(voltage, current, [lead, -lead])
    }
    if (reactive === undefined || !apparent) continue
    const lead = clampedArc(Math.asin, reactive / apparent)
    return eitherAngle(voltage, current, [lead, 180 - lead])
  }
  return undefined
}

function choiceOfSines(draft: Draft, clues: Clues): Choice | undefined {
  for (const { phasor, against, sine, either, turn } of clues.sines) {
    if (draft.isRelated(phasor, against)) continue
    const lead = clampedArc(Math.asin, sine)
    const angles = either ? [lead, -lead, 180 - lead, lead - 180] : [lead, 180 - lead]
    return eitherAngle(
      phasor,
      against,
      angles.map((angle) => angle - turn),
    )
  }
  return undefined
}

function eitherAngle(
  phasor: PhasorIndex,
  against: PhasorIndex,
  degrees: readonly number[],
): Choice {
  return degrees.map((lead) => (draft) => draft.relate(phasor, against, lead))
}
