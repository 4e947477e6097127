import type { Measure } from './measure'
import {
  dragFirstOf100,
  dragLooseAmong1000,
  drawAmong100,
  drawAmong2000,
  redraw1000,
} from './measures/board'
import { falseAlarms, lostLoops, unnoticed, valuesOutside } from './measures/calibration'
import { estimateForty, estimateSix, growthOfEstimate } from './measures/estimator'
import { bytesOfFirstLoad, firstShaftsOnScreen } from './measures/first-load'
import { charactersOfLink, linkAgainstDeflate } from './measures/link'
import { picking2000 } from './measures/picking'
import { reportAgainstEmptyPages } from './measures/report'
import { resultantAgainstLoop, resultantAgainstMathjs } from './measures/resultant'
import { svgAgainstJoining } from './measures/svg'

// `npm run bench`: each measure in turn, a line each. It never fails on a clock: a goal that is
// missed is said.
const measures: readonly Measure[] = [
  resultantAgainstLoop,
  resultantAgainstMathjs,
  svgAgainstJoining,
  reportAgainstEmptyPages,
  linkAgainstDeflate,
  charactersOfLink,
  bytesOfFirstLoad,
  firstShaftsOnScreen,
  dragFirstOf100,
  dragLooseAmong1000,
  redraw1000,
  drawAmong100,
  drawAmong2000,
  picking2000,
  estimateSix,
  estimateForty,
  lostLoops,
  falseAlarms,
  valuesOutside,
  unnoticed,
]

const width = Math.max(...measures.map(({ name }) => name.length))

/** A line of the table; the columns keep their width. */
function row(name: string, figure: string, goal: string, verdict: string): string {
  return `${name.padEnd(width)}  ${figure.padStart(8)}  ${goal.padStart(8)}  ${verdict}`
}

console.log(row('measure', 'ratio', 'goal', ''))
for (const { name, goal, unit, measure } of measures) {
  const figure = await measure()
  const shown = unit === undefined ? figure.toFixed(3) : String(figure)
  const verdict = figure <= goal ? 'met' : 'missed'
  console.log(row(name, shown, `≤ ${goal}`, unit === undefined ? verdict : `${verdict} (${unit})`))
}

console.log('\nHow the time to solve a job grows with it, in this run:')
for (const { phasors, ms } of growthOfEstimate()) {
  console.log(`${String(phasors).padStart(4)} phasors ${ms.toFixed(1).padStart(8)} ms`)
}
