import type { Id, Phasor, Place } from '../../sheet'
import { addMember, type Figure, type Home, type Workshop } from './figure'
import { vectorOf } from './vectors'

/**
 * Adds the phasors that no sum names: at their place, on the tip they hang on, else at the origin. A
 * phasor that hangs on what is not drawn, or on its own tip by way of others, starts at the origin.
 */
export function hangLoose(workshop: Workshop, phasors: readonly Phasor[]): void {
  for (const phasor of phasors) {
    if (workshop.summed.has(phasor.id) || workshop.homes.has(phasor.id)) continue
    if (hangsOn(phasor) === undefined) {
      addLoose(workshop, phasor)
      continue
    }
    // The chain is walked by a loop: thousands may hang one on another.
    for (const link of chainOf(workshop, phasor).reverse()) addLoose(workshop, link)
  }
}

/** The phasor, what it hangs on, and so on, up to what has a home or hangs on nothing. */
function chainOf(workshop: Workshop, phasor: Phasor): Phasor[] {
  const chain: Phasor[] = []
  const seen = new Set<Id>()
  let link: Phasor | undefined = phasor
  while (link && !seen.has(link.id) && !workshop.homes.has(link.id)) {
    if (workshop.summed.has(link.id)) break
    seen.add(link.id)
    chain.push(link)
    link = hangsOn(link) === undefined ? undefined : workshop.phasors.get(hangsOn(link) as Id)
  }
  return chain
}

function hangsOn({ tail }: Phasor): Id | undefined {
  return tail && 'tipOf' in tail ? tail.tipOf : undefined
}

function addLoose(workshop: Workshop, phasor: Phasor): void {
  const vector = vectorOf(workshop.vectors, phasor.id)
  if (!vector) return
  const home = homeOf(workshop, phasor)
  const figure = home?.figure ?? createFigure(workshop, phasor)
  addMember(workshop, figure, {
    key: `loose:${phasor.id}`,
    role: 'loose',
    phasor: phasor.id,
    sign: 1,
    quantity: phasor.quantity,
    after: home?.index ?? -1,
    vector,
  })
}

function homeOf({ homes }: Workshop, phasor: Phasor): Home | undefined {
  const parent = hangsOn(phasor)
  return parent === undefined ? undefined : homes.get(parent)
}

function createFigure({ figures }: Workshop, { id, quantity, tail }: Phasor): Figure {
  const place: Place | undefined = tail && 'x' in tail ? tail : undefined
  const key = `loose:${id}`
  const figure: Figure = place
    ? { key, isSum: false, quantity, members: [], start: place }
    : { key, isSum: false, quantity, members: [] }
  figures.push(figure)
  return figure
}
