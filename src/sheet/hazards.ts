import type { Caution } from './evaluation'
import type { Hazard, Sheet } from './types'

/**
 * The usual hazards of taking ac readings, to begin a record with (common practice, no source). The risk
 * is that of the hazard left alone. Whoever completes the record changes them to what is there.
 */
export const usualHazards: readonly Hazard[] = [
  {
    hazard: 'Live parts: shock and arc',
    control:
      'Measure dead where that will do. Else covers and barriers in place, gloves and eye protection, meter and leads of the category of the place.',
    risk: 'high',
    supervision: 'A second person who can isolate the supply',
  },
  {
    hazard: 'Stored charge in capacitors, cables and windings',
    control: 'Isolate, discharge, earth, and prove dead before anything is touched or clipped on.',
    risk: 'high',
  },
  {
    hazard: 'Hot parts: resistors, cores, motor frames',
    control: 'Let them cool or keep clear; heat-proof leads and clips.',
    risk: 'medium',
  },
  {
    hazard: 'Loose leads and clips that slip off',
    control:
      'Shrouded leads with finger guards, looked over before use; one hand where possible; clip on with the supply isolated.',
    risk: 'medium',
  },
  {
    hazard: 'An open CT secondary: dangerous voltage across the gap',
    control:
      'Short the secondary with a link before a meter is put in or taken out; never open it while the primary carries current.',
    risk: 'high',
    supervision: 'Someone who knows the CT circuit',
  },
]

/** The usual hazards that the sheet does not list yet. */
export function missingHazards(sheet: Sheet): readonly Hazard[] {
  return usualHazards.filter(({ hazard }) => !isListed(sheet, hazard))
}

/**
 * What the numbers give to take care of, as hazards that wait for their control. The risk is high until
 * someone who can judge it says otherwise. Those that the sheet lists are left out.
 */
export function hazardsFrom(sheet: Sheet, cautions: readonly Caution[]): readonly Hazard[] {
  const texts = [...new Set(cautions.map(({ text }) => text))]
  return texts
    .filter((text) => !isListed(sheet, text))
    .map((text) => ({ hazard: text, control: '', risk: 'high' }))
}

function isListed({ report }: Sheet, text: string): boolean {
  return (report?.hazards ?? []).some(({ hazard }) => hazard === text)
}
