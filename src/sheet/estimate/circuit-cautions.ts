import type { Caution } from '../evaluation'
import type { Sheet } from '../types'
import { chargeCautions } from './hazards/charges'
import { exportCautions } from './hazards/export'
import type { Figures } from './hazards/figures'
import { ratingCautions } from './hazards/ratings'
import { resonanceCautions } from './hazards/resonance'
import { standInCautions } from './hazards/stand-ins'
import { stepUpCautions, touchCautions } from './hazards/voltages'

/**
 * The cautions that the numbers of a sheet call for, each with the figure it rests on: touch voltage,
 * voltages above the supply's, charged capacitors, ratings, resonance, exported power, and what the
 * prediction takes for something that it is not. Each ends by deferring to local rules and licensed
 * practice. Touch voltages are looked at on every sheet, the rest where there are elements.
 */
export function circuitCautions(sheet: Sheet, figures: Figures): readonly Caution[] {
  return [
    ...touchCautions(sheet, figures),
    ...stepUpCautions(sheet, figures),
    ...ratingCautions(sheet, figures),
    ...chargeCautions(sheet, figures),
    ...resonanceCautions(sheet, figures),
    ...exportCautions(sheet, figures),
    ...standInCautions(sheet),
  ]
}
