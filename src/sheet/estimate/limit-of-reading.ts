import { accuracyLimits, parseAccuracy, resolutionOf } from '../../core'
import type { Accuracy, Instrument, Reading, Sheet, Shown } from '../types'

/** What a display showed, and what is needed to know how well. */
export interface Indication {
  readonly value: number
  readonly shown: Shown
  readonly unit: string
  /** Which of the instrument's functions showed it. */
  readonly of: Accuracy['of']
}

/** The half-widths of an indication, in the unit of what was shown. */
export interface IndicationLimit {
  /** The indication's own. */
  readonly own: number
  /** What the maker gives of the reading: common to all readings of the instrument's function and range. */
  readonly ofReading?: { readonly key: string; readonly halfWidth: number }
  readonly basis: 'stated' | 'instrument' | 'assumed'
}

/** Per cent, degrees and per cent of elements that are assumed where no limit is stated. */
export function assumedLimits({ assumed }: Sheet): {
  readonly percent: number
  readonly degrees: number
  readonly elementPercent: number
} {
  return {
    percent: assumed?.percent ?? 1,
    degrees: assumed?.degrees ?? 1,
    elementPercent: assumed?.elementPercent ?? 5,
  }
}

/** The step of the last digit that was shown; none for a bare number. */
function resolutionOfShown(shown: Shown): number | undefined {
  return typeof shown === 'string' ? resolutionOf(shown) : undefined
}

/** The accuracy statement that applies: of that function, on that range, or the smallest range that reaches. */
function statementFor(
  instrument: Instrument,
  { of, value }: Indication,
  range: number | undefined,
): Accuracy | undefined {
  const statements = (instrument.accuracy ?? []).filter((each) => each.of === of)
  if (range !== undefined) {
    const exact = statements.find((each) => each.range === range)
    if (exact) return exact
    return statements.find((each) => each.range === undefined)
  }
  const reaching = statements
    .filter((each) => each.range === undefined || each.range >= Math.abs(value))
    .sort((a, b) => (a.range ?? Number.POSITIVE_INFINITY) - (b.range ?? Number.POSITIVE_INFINITY))
  return reaching[0] ?? statements[0]
}

function byInstrument(
  instrument: Instrument,
  indication: Indication,
  range: number | undefined,
): IndicationLimit | undefined {
  const statement = statementFor(instrument, indication, range)
  if (statement === undefined) return undefined
  const parsed = parseAccuracy(statement.text, indication.unit)
  if (!parsed.ok) return undefined
  const limits = accuracyLimits(parsed.value, {
    value: indication.value,
    range: range ?? statement.range,
    resolution: resolutionOfShown(indication.shown),
  })
  if (!limits.ok) return undefined
  const { ofReading, ofRange, digits, absolute } = limits.value
  const key = `${instrument.id} ${statement.of} ${statement.range ?? range ?? ''}`
  return {
    own: ofRange + digits + absolute,
    ofReading: { key, halfWidth: ofReading },
    basis: 'instrument',
  }
}

/**
 * The limit of an indication: as stated with the reading, else by the instrument's accuracy, else
 * `assumed`, which is at least half a step of the last digit where it would otherwise be nothing.
 */
export function limitOfIndication(
  reading: Reading,
  instrument: Instrument | undefined,
  indication: Indication,
  assumed: number,
): IndicationLimit {
  if (reading.limit !== undefined) return { own: reading.limit, basis: 'stated' }
  const byMaker = instrument && byInstrument(instrument, indication, reading.range)
  if (byMaker !== undefined) return byMaker
  const halfStep = (resolutionOfShown(indication.shown) ?? 0) / 2
  return { own: assumed > 0 ? assumed : halfStep, basis: 'assumed' }
}
