import type { Change } from '../edits/change'
import { referenceOf } from '../reference'
import type { PhasorId, Reading, Sheet } from '../types'

/** What the next reading is likely to be of, and how it is likely to be taken. */
export interface NextReading {
  readonly of: PhasorId
  readonly kind: Reading['kind']
  readonly against?: PhasorId
  readonly with?: PhasorId
  /** Instrument, range, channel and pass, as the last reading of the kind was taken. */
  readonly taken: Change<Reading>
}

/**
 * The reading that comes next: of the kind of the last one, of the next phasor of the list that was not
 * read so; when all were, the angles, against the reference; when those were read too, the last again.
 * Undefined on a sheet without phasors.
 */
export function nextReading(sheet: Sheet): NextReading | undefined {
  const [firstPhasor] = sheet.phasors
  if (firstPhasor === undefined) return undefined
  const last = sheet.readings?.at(-1)
  if (last === undefined) return { of: firstPhasor.id, kind: 'magnitude', taken: {} }
  const of = nextUnread(sheet, last.of, last.kind)
  if (of !== undefined) return following(sheet, of, last.kind)
  const angle = last.kind === 'magnitude' ? nextUnread(sheet, undefined, 'angle') : undefined
  return angle === undefined
    ? following(sheet, last.of, last.kind)
    : following(sheet, angle, 'angle')
}

/** The next phasor after one, in the order of the list and then from its top, not read in that kind. */
function nextUnread(
  sheet: Sheet,
  after: PhasorId | undefined,
  kind: Reading['kind'],
): PhasorId | undefined {
  const read = new Set(
    (sheet.readings ?? []).filter((reading) => reading.kind === kind).map(({ of }) => of),
  )
  const isAngle = kind !== 'magnitude'
  const reference = referenceOf(sheet)
  const at = sheet.phasors.findIndex(({ id }) => id === after) + 1
  const order = [...sheet.phasors.slice(at), ...sheet.phasors.slice(0, at)]
  return order.find(
    ({ id, magnitude, angle, real }) =>
      !read.has(id) &&
      !(isAngle && id === reference) &&
      (isAngle ? angle : magnitude) === undefined &&
      real === undefined,
  )?.id
}

function following(sheet: Sheet, of: PhasorId, kind: Reading['kind']): NextReading {
  const quantities = new Map(sheet.phasors.map(({ id, quantity }) => [id, quantity]))
  const alike = (sheet.readings ?? []).filter((reading) => reading.kind === kind)
  const last =
    alike.findLast((reading) => quantities.get(reading.of) === quantities.get(of)) ??
    (kind === 'magnitude' ? undefined : alike.at(-1))
  const against = last && 'against' in last && last.against !== of ? last.against : undefined
  const current = last && 'with' in last && last.with !== of ? last.with : undefined
  return {
    of,
    kind,
    ...(against === undefined ? {} : { against }),
    ...(current === undefined ? {} : { with: current }),
    taken: last === undefined ? {} : takenAs(last),
  }
}

/** How a reading was taken, without what it showed. */
function takenAs(reading: Reading): Change<Reading> {
  const { instrument, range, channel, pass } = reading
  const known = { instrument, range, channel, pass }
  return Object.fromEntries(Object.entries(known).filter(([, value]) => value !== undefined))
}
