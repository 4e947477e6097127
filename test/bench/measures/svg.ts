import { layout, svg } from '../../../src/drawing'
import { quick, type Sheet } from '../../../src/sheet'
import { type Measure, millisecondsOf, ratioOfMedians } from '../measure'

/** A thousand phasors, every one a term of one sum. */
function thousand(): Sheet {
  const phasors = Array.from({ length: 1000 }, (_, index) => ({
    id: `V${index}`,
    label: `V${index}`,
    quantity: 'voltage' as const,
    magnitude: { value: 1 + ((index * 37) % 90) / 10 },
    angle: { value: ((index * 101) % 360) - 179 },
  }))
  return {
    format: 'phasogon-sheet',
    version: 1,
    title: 'A thousand phasors',
    phasors,
    sums: [{ id: 's1', terms: phasors.map(({ id }) => ({ phasor: id })) }],
  }
}

/** A document taken apart: each figure, and what stands between figures, as strings of their own. */
function takeApart(text: string): string[] {
  const parts = text.match(/-?\d+(?:\.\d+)?|[^\d-]+|-/g) ?? []
  // Through JSON, so that each is a string by itself and no window on the whole.
  return JSON.parse(JSON.stringify(parts))
}

/** The least that writing the document can be: its strings, all ready, put together. */
function join(parts: readonly string[]): string {
  let text = ''
  for (const part of parts) text += part
  // Reading from the middle makes the engine do what it may have put off.
  text.charCodeAt(text.length >> 1)
  return text
}

export const svgAgainstJoining: Measure = {
  name: 'SVG of 1,000 phasors : joining the same strings',
  goal: 3,
  measure: () => {
    const sheet = thousand()
    const scene = layout(sheet, quick(sheet))
    const text = svg(scene, '{}')
    const parts = takeApart(text)
    if (join(parts) !== text) throw new Error('The two documents are not the same.')
    return ratioOfMedians(
      {
        ours: () => millisecondsOf(() => svg(scene, '{}')),
        theirs: () => millisecondsOf(() => join(parts)),
      },
      101,
    )
  },
}
