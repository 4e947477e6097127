import { failure, type Result, success } from '../../core'
import type { Hazard, Sheet } from '../types'
import { type Change, withChange, without } from './change'
import type { EditKind } from './edit-kind'
import { orNone } from './lists'

type Report = NonNullable<Sheet['report']>

/** Changes what the report says in words; null takes a field away. */
export interface SetReport {
  readonly kind: 'set-report'
  readonly report: Change<Pick<Report, 'criterion' | 'conclusion'>>
}

/** Adds a hazard behind the others, or before the one at `at`. */
export interface AddHazard {
  readonly kind: 'add-hazard'
  readonly hazard: Hazard
  readonly at?: number
}

/** Changes some fields of the hazard at `at`, counted from 0; null takes a field away. */
export interface SetHazard {
  readonly kind: 'set-hazard'
  readonly at: number
  readonly change: Change<Hazard>
}

/** Takes the hazard at `at`, counted from 0, off the list. */
export interface RemoveHazard {
  readonly kind: 'remove-hazard'
  readonly at: number
}

/** Changes the criterion and the conclusion. */
export const setReport: EditKind<SetReport> = {
  apply: (sheet, { report }) => success(withReport(sheet, report)),
  describe: (_, { report }) => `Change the ${Object.keys(report).join(' and the ') || 'report'}`,
}

/** Adds a hazard. */
export const addHazard: EditKind<AddHazard> = {
  apply: (sheet, { hazard, at }) => {
    const hazards = hazardsOf(sheet)
    return success(withHazards(sheet, hazards.toSpliced(at ?? hazards.length, 0, hazard)))
  },
  describe: (_, { hazard }) => `Add ${named(hazard)}`,
}

/** Changes a hazard. */
export const setHazard: EditKind<SetHazard> = {
  apply: (sheet, { at, change }) => {
    const found = hazardAt(sheet, at)
    if (!found.ok) return found
    const hazards = hazardsOf(sheet).with(at, withChange(found.value, change))
    return success(withHazards(sheet, hazards))
  },
  describe: (sheet, { at }) => `Change ${namedAt(sheet, at)}`,
}

/** Takes a hazard off the list. */
export const removeHazard: EditKind<RemoveHazard> = {
  apply: (sheet, { at }) => {
    const found = hazardAt(sheet, at)
    return found.ok ? success(withHazards(sheet, hazardsOf(sheet).toSpliced(at, 1))) : found
  },
  describe: (sheet, { at }) => `Delete ${namedAt(sheet, at)}`,
}

function hazardsOf({ report }: Sheet): readonly Hazard[] {
  return report?.hazards ?? []
}

function hazardAt(sheet: Sheet, at: number): Result<Hazard> {
  const hazard = hazardsOf(sheet)[at]
  return hazard === undefined
    ? failure(`There is no hazard number ${at + 1} on this sheet.`)
    : success(hazard)
}

function withHazards(sheet: Sheet, hazards: readonly Hazard[]): Sheet {
  return withReport(sheet, { hazards: orNone(hazards) })
}

function withReport(sheet: Sheet, change: Change<Report>): Sheet {
  const report = withChange(sheet.report ?? {}, change)
  return Object.keys(report).length === 0 ? without(sheet, 'report') : { ...sheet, report }
}

function named({ hazard }: Hazard): string {
  const [words = ''] = hazard.trim().split(/\s*[.:;\n]\s*/)
  return words === '' ? 'a hazard' : `the hazard “${words}”`
}

function namedAt(sheet: Sheet, at: number): string {
  const hazard = hazardsOf(sheet)[at]
  return hazard === undefined ? 'a hazard' : named(hazard)
}
