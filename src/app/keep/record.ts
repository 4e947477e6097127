import type { Copy } from '../store'
import { markOf } from './mark'

/** A sheet as the browser keeps it: its text, and beside it what the sheet itself must not carry. */
export interface KeptSheet {
  readonly id: string
  /** Rises by one with each change, in whatever tab it was made. */
  readonly revision: number
  /** The page that made the last change. */
  readonly writer: string
  /** How many of its changes each page has brought in: those of the last pages alone. */
  readonly seen: Readonly<Record<string, number>>
  /** Rises with each change to any sheet of the store, so that no clock sets their order. */
  readonly touched: number
  /** When it was changed, in milliseconds of this device's clock: for reading alone. */
  readonly saved: number
  readonly title: string
  /** What a search looks through. */
  readonly words: string
  /** The sheet, as `serializeSheet` writes it. */
  readonly text: string
  /** Marks of the states that it has had, the latest last: a link to any of them is its own. */
  readonly marks: readonly string[]
  readonly copy?: Copy
}

/** What lies in the store under a sheet's name and is none. It is left as it is. */
export interface BrokenRecord {
  readonly id: string
  readonly content: unknown
}

/**
 * Reads what the store holds under a name; undefined where it is no kept sheet, or where its text is not
 * the one that was kept.
 */
export function parseRecord(id: string, content: unknown): KeptSheet | undefined {
  if (typeof content !== 'object' || content === null) return undefined
  const record: Partial<Record<keyof KeptSheet, unknown>> = content
  const isKept =
    record.id === id &&
    isCount(record.revision) &&
    isCount(record.touched) &&
    Number.isFinite(record.saved) &&
    [record.writer, record.title, record.words].every(isText) &&
    isText(record.text) &&
    Array.isArray(record.marks) &&
    record.marks.at(-1) === markOf(record.text) &&
    record.marks.every(isText) &&
    isCounts(record.seen) &&
    (record.copy === undefined || isCopy(record.copy))
  return isKept ? (content as KeptSheet) : undefined
}

function isText(value: unknown): value is string {
  return typeof value === 'string'
}

function isCount(value: unknown): boolean {
  return Number.isSafeInteger(value) && Number(value) >= 0
}

function isCounts(value: unknown): boolean {
  return typeof value === 'object' && value !== null && Object.values(value).every(isCount)
}

/** Whether a value says of what a sheet is a copy. */
export function isCopy(value: unknown): value is Copy {
  if (typeof value !== 'object' || value === null) return false
  const { of, why }: { of?: unknown; why?: unknown } = value
  return isText(of) && (why === 'link' || why === 'tabs')
}
