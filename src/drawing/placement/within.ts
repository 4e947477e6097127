import type { Id, Phasor, Sheet } from '../../sheet'

/** The sums and loose phasors that some arrows belong to. */
export interface PartsWithin {
  readonly sums: ReadonlySet<Id>
  readonly loose: readonly Phasor[]
}

/** What must be placed so that the arrows of these keys lie where they do when all are placed. */
export function partsWithin(
  sheet: Sheet,
  phasors: ReadonlyMap<Id, Phasor>,
  keys: ReadonlySet<string>,
): PartsWithin {
  const sums = new Set<Id>()
  const loose: Phasor[] = []
  for (const key of keys) {
    const [role, id = ''] = key.split(':')
    const phasor = role === 'loose' ? phasors.get(id) : undefined
    if (phasor) loose.push(phasor)
    else sums.add(id)
  }
  const held = new Set(loose.flatMap((phasor) => endOfChain(phasors, phasor) ?? []))
  if (held.size > 0) {
    for (const { id, terms, equals } of sheet.sums ?? []) {
      if (held.has(String(equals)) || terms.some((term) => held.has(term.phasor))) sums.add(id)
    }
  }
  return { sums, loose }
}

/** The phasor that a chain of loose ones hangs on in the end; undefined where it hangs on nothing. */
function endOfChain(phasors: ReadonlyMap<Id, Phasor>, phasor: Phasor): Id | undefined {
  const seen = new Set<Id>()
  let link: Phasor | undefined = phasor
  let end: Id | undefined
  while (link?.tail && 'tipOf' in link.tail && !seen.has(link.id)) {
    seen.add(link.id)
    end = link.tail.tipOf
    link = phasors.get(end)
  }
  return end
}
