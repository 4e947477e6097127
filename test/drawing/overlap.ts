import { type Box, boundsOf, frameOf, type Item, type Scene } from '../../src/drawing'

/** What of a scene a label covers that it must not: each as a sentence; none where all is well. */
export function overlapsOf(scene: Scene): string[] {
  const labels = scene.items.flatMap((item) =>
    item.part === 'label' && item.kind === 'text' ? [{ item, box: boundsOf(item) }] : [],
  )
  const leaders = scene.items.filter(({ part, kind }) => part === 'label' && kind === 'lines')
  const fixed = scene.items.filter(({ part }) => FIXED.has(part))
  const frame = frameOf(scene)
  const found: string[] = []
  for (const [index, { item, box }] of labels.entries()) {
    const name = item.runs.map(({ text }) => text).join('')
    const { left, right, bottom, top } = box
    if (left < frame.left || right > frame.right || bottom < frame.bottom || top > frame.top) {
      found.push(`${name} leaves the frame`)
    }
    for (const other of labels.slice(index + 1)) {
      if (isMeeting(box, other.box)) found.push(`${name} lies on ${other.item.arrow}`)
    }
    for (const part of fixed) if (isCovering(box, part)) found.push(`${name} covers a ${part.part}`)
    for (const leader of leaders) {
      const isOther = leader.arrow !== item.arrow
      if (isOther && isCovering(box, leader))
        found.push(`${name} lies on the leader of ${leader.arrow}`)
    }
  }
  return found
}

const FIXED: ReadonlySet<Item['part']> = new Set([
  'arrow',
  'gap',
  'angle',
  'title-block',
  'scale-bar',
])

function isMeeting(one: Box, other: Box): boolean {
  return (
    one.left < other.right &&
    other.left < one.right &&
    one.bottom < other.top &&
    other.bottom < one.top
  )
}

function isCovering(box: Box, item: Item): boolean {
  if (item.part === 'title-block' || item.part === 'scale-bar' || item.kind === 'text') {
    return isMeeting(box, boundsOf(item))
  }
  const half = (item.width ?? 0) / 2
  return chainsOf(item).some((chain) =>
    chain.slice(1).some((point, index) => isCut(box, chain[index] ?? point, point, half)),
  )
}

type Point = readonly [number, number]

/** An item as chains of points; arcs as chords of two degrees. */
function chainsOf(item: Exclude<Item, { kind: 'text' }>): Point[][] {
  switch (item.kind) {
    case 'lines': {
      const chains: Point[][] = []
      for (let at = 0; at < item.segments.length; at += 4) {
        const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = item.segments.slice(at, at + 4)
        chains.push([
          [x1, y1],
          [x2, y2],
        ])
      }
      return chains
    }
    case 'path': {
      const chain: Point[] = []
      for (let at = 0; at < item.points.length; at += 2) {
        chain.push([item.points[at] ?? 0, item.points[at + 1] ?? 0])
      }
      const [first] = chain
      return [item.closed && first ? [...chain, first] : chain]
    }
    case 'arc': {
      const steps = Math.ceil(Math.abs(item.sweep) / 2)
      const chain = Array.from({ length: steps + 1 }, (_, step): Point => {
        const angle = ((item.start + (item.sweep * step) / steps) * Math.PI) / 180
        return [
          item.centre.x + item.radius * Math.cos(angle),
          item.centre.y + item.radius * Math.sin(angle),
        ]
      })
      return [chain]
    }
  }
}

/**
 * Whether a stroke of some width meets a box, by separating axes: the two sides of the box and the
 * normal of the stroke.
 */
function isCut(box: Box, [x1, y1]: Point, [x2, y2]: Point, half: number): boolean {
  if (Math.max(x1, x2) + half <= box.left || Math.min(x1, x2) - half >= box.right) return false
  if (Math.max(y1, y2) + half <= box.bottom || Math.min(y1, y2) - half >= box.top) return false
  const length = Math.hypot(x2 - x1, y2 - y1)
  if (length === 0) return true
  const [nx, ny] = [(y1 - y2) / length, (x2 - x1) / length]
  const corners = [
    [box.left, box.bottom],
    [box.right, box.bottom],
    [box.left, box.top],
    [box.right, box.top],
  ].map(([x = 0, y = 0]) => (x - x1) * nx + (y - y1) * ny)
  return Math.min(...corners) < half && Math.max(...corners) > -half
}
