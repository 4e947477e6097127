import type { Evaluation, Id, Phasor, Quantity, Sheet, Sum } from '../../sheet'
import { addMember, type Figure, type Workshop } from './figure'
import { hangLoose } from './loose'
import { createVectors, measuredOf, resultantOf, vectorOf } from './vectors'
import { partsWithin } from './within'

/**
 * The figures of a sheet: its sums in order, then what is loose. What is open is left out.
 *
 * @param within Only the figures of arrows with these keys.
 */
export function figuresOf(
  sheet: Sheet,
  evaluation: Evaluation,
  within?: ReadonlySet<string>,
): Figure[] {
  const phasors = new Map<Id, Phasor>()
  for (const phasor of sheet.phasors) phasors.set(phasor.id, phasor)
  const vectors = createVectors(evaluation)
  const workshop: Workshop = {
    phasors,
    vectors,
    figures: [],
    homes: new Map(),
    summed: new Set(),
  }
  const parts = within && partsWithin(sheet, phasors, within)
  for (const sum of sheet.sums ?? []) if (!parts || parts.sums.has(sum.id)) addSum(workshop, sum)
  hangLoose(workshop, parts ? parts.loose : sheet.phasors)
  return workshop.figures
}

function addSum(workshop: Workshop, sum: Sum): void {
  const { phasors, vectors, summed } = workshop
  for (const { phasor } of sum.terms) summed.add(phasor)
  if (typeof sum.equals === 'string') summed.add(sum.equals)
  const quantity = quantityOf(workshop, sum)
  if (quantity === undefined) return
  const figure: Figure = {
    key: `sum:${sum.id}`,
    isSum: true,
    quantity,
    members: [],
    ...(sum.start && { start: sum.start }),
  }
  addTerms(workshop, figure, sum)
  const measured = typeof sum.equals === 'string' && measuredOf(vectors, sum.id, sum.equals)
  if (measured && typeof sum.equals === 'string') {
    addMember(workshop, figure, {
      key: `measured:${sum.id}`,
      role: 'measured',
      phasor: sum.equals,
      sum: sum.id,
      sign: 1,
      quantity: phasors.get(sum.equals)?.quantity ?? quantity,
      after: -1,
      vector: measured,
    })
  }
  const resultant = resultantOf(vectors, sum.id)
  if (resultant) {
    addMember(workshop, figure, {
      key: `resultant:${sum.id}`,
      role: 'resultant',
      sum: sum.id,
      sign: 1,
      quantity,
      after: -1,
      vector: resultant,
    })
  }
  if (figure.members.length > 0) workshop.figures.push(figure)
}

function addTerms(workshop: Workshop, figure: Figure, sum: Sum): void {
  const isChain = sum.arrangement !== 'from-origin'
  let after = -1
  sum.terms.forEach(({ phasor: id, sign = 1 }, position) => {
    const phasor = workshop.phasors.get(id)
    const vector = phasor && vectorOf(workshop.vectors, id)
    if (!vector) return
    const index = addMember(workshop, figure, {
      key: `term:${sum.id}:${position}`,
      role: 'term',
      phasor: id,
      sum: sum.id,
      sign,
      quantity: phasor.quantity,
      after,
      vector: sign === 1 ? vector : { re: -vector.re, im: -vector.im },
    })
    if (isChain) after = index
  })
}

/** A sum is of its first term's quantity. */
function quantityOf({ phasors }: Workshop, sum: Sum): Quantity | undefined {
  for (const { phasor } of sum.terms) {
    const known = phasors.get(phasor)
    if (known) return known.quantity
  }
  return typeof sum.equals === 'string' ? phasors.get(sum.equals)?.quantity : undefined
}
