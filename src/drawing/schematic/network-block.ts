import { type Id, isGroup, type Phasor, type Sheet, type WiredNode, wiredNodes } from '../../sheet'
import type { Palette } from '../theme'
import type { Block } from './block'
import { elementBlock, type Shown } from './element-block'
import { parallelBlock, seriesBlock, withDirections } from './group-block'

/** What a circuit is drawn with, and which phasors stand somewhere already. */
interface Drawing {
  readonly phasors: ReadonlyMap<Id, Phasor>
  /** Voltages across an element: no group repeats them. */
  readonly across: ReadonlySet<Id>
  readonly shown: Set<Id>
  readonly palette: Palette
}

/**
 * The elements of a circuit as they hang together. Each phasor's direction stands once: a voltage at the
 * first element that it is across, else above its group; a current where it first flows.
 *
 * @param shown Phasors whose directions stand elsewhere.
 */
export function networkBlock(
  { phasors }: Sheet,
  circuit: WiredNode,
  shown: readonly Id[],
  palette: Palette,
): Block {
  const nodes = [...wiredNodes(circuit)]
  return blockOf(circuit, {
    phasors: new Map(phasors.map((phasor) => [phasor.id, phasor])),
    across: new Set(nodes.flatMap(({ element }) => element?.voltage ?? [])),
    shown: new Set(shown),
    palette,
  })
}

function blockOf(wired: WiredNode, drawing: Drawing): Block {
  const { node, element, voltage, current, branches } = wired
  const { across, palette } = drawing
  if (!isGroup(node)) {
    if (element === undefined) return seriesBlock([])
    return elementBlock(element, directionsOf(voltage, current, drawing), palette)
  }
  const isSeries = 'series' in node
  const own = directionsOf(
    voltage !== undefined && across.has(voltage) ? undefined : voltage,
    isSeries ? undefined : current,
    drawing,
  )
  const parts = branches.map((branch) => blockOf(branch, drawing))
  const block = isSeries ? seriesBlock(parts) : parallelBlock(parts, palette)
  return withDirections(block, own, palette)
}

/** The phasors that stand nowhere yet; from now on they stand here. */
function directionsOf(
  voltage: Id | undefined,
  current: Id | undefined,
  { phasors, shown }: Drawing,
): Shown {
  const take = (id: Id | undefined) => {
    const phasor = id === undefined || shown.has(id) ? undefined : phasors.get(id)
    if (phasor) shown.add(phasor.id)
    return phasor
  }
  return { voltage: take(voltage), current: take(current) }
}
