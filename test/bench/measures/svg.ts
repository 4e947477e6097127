import { layout, svg } from '../../../src/drawing'
import { evaluate, type Sheet } from '../../../src/sheet'
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

/** A document taken apart: what stands between its figures, and the figures as numbers. */
function takeApart(text: string): { fixed: string[]; figures: number[] } {
  const figure = /-?\d+(?:\.\d+)?/g
  const matches = [...text.matchAll(figure)].filter(([shown]) => String(Number(shown)) === shown)
  const fixed: string[] = []
  let end = 0
  for (const match of matches) {
    fixed.push(text.slice(end, match.index))
    end = match.index + match[0].length
  }
  fixed.push(text.slice(end))
  return { fixed, figures: matches.map(([shown]) => Number(shown)) }
}

/** The least that writing a document can be: its fixed parts and its figures, joined. */
function join(fixed: readonly string[], figures: readonly number[]): string {
  const parts: string[] = []
  for (let index = 0; index < figures.length; index += 1) {
    parts.push(fixed[index] ?? '', String(figures[index]))
  }
  parts.push(fixed[figures.length] ?? '')
  return parts.join('')
}

export const svgAgainstJoining: Measure = {
  name: 'SVG of 1,000 phasors : joining the same strings and figures',
  goal: 3,
  measure: () => {
    const sheet = thousand()
    const scene = layout(sheet, evaluate(sheet))
    const text = svg(scene, JSON.stringify(sheet))
    const { fixed, figures } = takeApart(text)
    if (join(fixed, figures) !== text) throw new Error('The two documents are not the same.')
    return ratioOfMedians(
      {
        ours: () => millisecondsOf(() => svg(scene, JSON.stringify(sheet))),
        theirs: () => millisecondsOf(() => join(fixed, figures)),
      },
      25,
    )
  },
}
