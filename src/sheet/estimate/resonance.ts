import {
  type ElementTree,
  elementValuesOf,
  type PredictedTree,
  resonanceOf,
} from '../../core/circuit'
import { wiringOf } from '../circuit/wiring'
import type { ResonanceEvaluation } from '../evaluation'
import type { Sheet } from '../types'
import { treeOf } from './prediction'

/** The resonance nearest to the sheet's frequency, of the values that are predicted from. */
export function evaluateResonance(sheet: Sheet): ResonanceEvaluation | undefined {
  const wiring = wiringOf(sheet)
  const tree = wiring && elementTree(treeOf(wiring, sheet))
  return tree && resonanceOf(tree, sheet.frequency?.value)
}

/** The tree without tolerances; undefined where a value is not known. */
function elementTree(tree: PredictedTree): ElementTree | undefined {
  if ('kind' in tree) {
    const element = elementValuesOf(tree)
    return element && { element }
  }
  const isSeries = 'series' in tree
  const branches = (isSeries ? tree.series : tree.parallel).map(elementTree)
  const known = branches.filter((branch) => branch !== undefined)
  if (known.length !== branches.length || known.length === 0) return undefined
  return isSeries ? { series: known } : { parallel: known }
}
