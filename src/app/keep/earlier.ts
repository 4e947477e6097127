import { type Instrument, type Job, parseSheetText, type Sheet } from '../../sheet'
import type { KeptSheet } from './record'

/** What was written on other sheets and may be meant again, the latest first, each once. */
export interface Earlier {
  readonly sites: readonly string[]
  readonly circuits: readonly string[]
  readonly conditions: readonly string[]
  /** Whoever tested, checked or approved. */
  readonly people: readonly string[]
  readonly instruments: readonly Instrument[]
}

/** Nothing was written before. */
export const NOTHING_EARLIER: Earlier = {
  sites: [],
  circuits: [],
  conditions: [],
  people: [],
  instruments: [],
}

/** So many of the latest sheets are looked into. */
const MOST_SHEETS = 20
/** A list that is longer is no help. */
const MOST_OFFERS = 12

/** What the kept sheets offer to the one that is open, whose own words are left out. */
export function earlierIn(kept: readonly KeptSheet[], open: string): Earlier {
  const sheets = kept
    .filter(({ id }) => id !== open)
    .slice(0, MOST_SHEETS)
    .flatMap(({ text }): readonly Sheet[] => {
      const parsed = parseSheetText(text)
      return parsed.ok ? [parsed.sheet] : []
    })
  const words = (fieldsOf: (job: Job) => readonly (string | undefined)[]) =>
    distinct(
      sheets.flatMap(({ job }) => (job ? fieldsOf(job) : [])).map((word) => word?.trim() ?? ''),
      (word) => word,
    ).filter((word) => word !== '')
  return {
    sites: words(({ site }) => [site]).slice(0, MOST_OFFERS),
    circuits: words(({ circuit }) => [circuit]).slice(0, MOST_OFFERS),
    conditions: words(({ conditions }) => [conditions]).slice(0, MOST_OFFERS),
    people: words((job) => [
      job.testedBy,
      job.checkedBy,
      job.approvedBy,
      ...(job.voided ?? []).map(({ by }) => by),
    ]).slice(0, MOST_OFFERS),
    instruments: distinct(
      sheets.flatMap(({ instruments = [] }) => instruments),
      nameWithSerial,
    ).slice(0, MOST_OFFERS),
  }
}

/** How an instrument is told from others of its kind: `Clamp meter, 20417`. */
export function nameWithSerial({ name, serial }: Instrument): string {
  return serial === undefined || serial.trim() === '' ? name : `${name}, ${serial}`
}

/** The items of which the key has not been met before. */
function distinct<Item>(items: readonly Item[], keyOf: (item: Item) => string): readonly Item[] {
  const first = new Map<string, Item>()
  for (const item of items) if (!first.has(keyOf(item))) first.set(keyOf(item), item)
  return [...first.values()]
}
