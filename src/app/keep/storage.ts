import { promisifyRequest, type UseStore } from 'idb-keyval'
import { createRecord, type Entry, judge } from './entry'
import { StorageError } from './problem'
import { type BrokenRecord, type KeptSheet, parseRecord } from './record'

/** What became of a change that was to be kept. */
export type Saved =
  | { readonly kind: 'kept' | 'included'; readonly record: KeptSheet }
  | { readonly kind: 'conflict' }

/** All that a store holds. */
export interface Contents {
  /** The latest change first. */
  readonly sheets: readonly KeptSheet[]
  readonly broken: readonly BrokenRecord[]
  /** Whether the clock stands before the time of a change that was already kept. */
  readonly isClockBack: boolean
}

/**
 * Where sheets are kept. Each call is done whole or not at all. What goes wrong comes as an error that
 * `problemOf` understands.
 */
export interface Storage {
  read(): Promise<Contents>
  /** The sheet of that id; undefined where there is none that can be read. */
  load(id: string): Promise<KeptSheet | undefined>
  save(entry: Entry): Promise<Saved>
  remove(id: string): Promise<void>
  /** Puts back what was removed, unless the sheet is back already. */
  restore(record: KeptSheet | BrokenRecord): Promise<void>
}

const version = 1
const headKey = 'store'
const sheetPrefix = 'sheet:'
/** A clock that is set right by the network moves by less than this, in milliseconds. */
const clockSlack = 60_000

/** What the store says of itself. */
interface Head {
  readonly version: number
  readonly touched: number
  /** The latest time at which anything was kept. */
  readonly saved: number
}

/** Keeps sheets in an object store of IndexedDB; `now` is the clock, in milliseconds. */
export function createStorage(use: UseStore, now: () => number = Date.now): Storage {
  return {
    read: () =>
      use('readonly', async (objects) => {
        const head = await readHead(objects)
        const keys = await promisifyRequest(objects.getAllKeys(sheetKeys()))
        const values = await promisifyRequest<unknown[]>(objects.getAll(sheetKeys()))
        const sheets: KeptSheet[] = []
        const broken: BrokenRecord[] = []
        for (const [index, content] of values.entries()) {
          const id = String(keys[index]).slice(sheetPrefix.length)
          const record = parseRecord(id, content)
          if (record) sheets.push(record)
          else broken.push({ id, content })
        }
        sheets.sort((one, other) => other.touched - one.touched)
        return { sheets, broken, isClockBack: now() < head.saved - clockSlack }
      }),

    load: (id) =>
      use('readonly', async (objects) => {
        await readHead(objects)
        return parseRecord(id, await promisifyRequest<unknown>(objects.get(sheetPrefix + id)))
      }),

    save: (entry) =>
      use('readwrite', async (objects): Promise<Saved> => {
        const head = await readHead(objects)
        const content = await promisifyRequest<unknown>(objects.get(sheetPrefix + entry.id))
        const kept = parseRecord(entry.id, content)
        // What cannot be read is not written over either.
        if (content !== undefined && kept === undefined) return { kind: 'conflict' }
        const verdict = judge(kept, entry)
        if (verdict === 'conflict') return { kind: verdict }
        if (verdict === 'included' && kept) return { kind: verdict, record: kept }
        const touched = head.touched + 1
        const saved = now()
        const record = createRecord(kept, entry, { touched, saved })
        objects.put(record, sheetPrefix + entry.id)
        await finish(objects, { version, touched, saved: Math.max(saved, head.saved) })
        return { kind: 'kept', record }
      }),

    remove: (id) =>
      use('readwrite', async (objects) => {
        const head = await readHead(objects)
        objects.delete(sheetPrefix + id)
        await finish(objects, head)
      }),

    restore: (record) =>
      use('readwrite', async (objects) => {
        const head = await readHead(objects)
        const key = sheetPrefix + record.id
        // A tab that still shows the sheet may have kept a later change of it.
        const content = await promisifyRequest<unknown>(objects.get(key))
        if (content !== undefined) return
        objects.put('content' in record ? record.content : record, key)
        await finish(objects, head)
      }),
  }
}

function sheetKeys(): IDBKeyRange {
  return IDBKeyRange.bound(sheetPrefix, `${sheetPrefix}\uffff`)
}

/** What the store says of itself; throws where a newer version of the page wrote it. */
async function readHead(objects: IDBObjectStore): Promise<Head> {
  const head: unknown = await promisifyRequest<unknown>(objects.get(headKey))
  const found: Partial<Record<keyof Head, unknown>> =
    typeof head === 'object' && head !== null ? head : {}
  if (typeof found.version === 'number' && found.version > version) throw new StorageError('newer')
  if (isCount(found.touched) && isCount(found.saved)) {
    return { version, touched: found.touched, saved: found.saved }
  }
  // The head is gone or was spoiled: the sheets themselves know how far the count had come.
  const values = await promisifyRequest<unknown[]>(objects.getAll(sheetKeys()))
  const counts = values.map((value) => (value as Partial<KeptSheet> | null)?.touched)
  return { version, touched: Math.max(0, ...counts.filter(isCount)), saved: 0 }
}

function isCount(value: unknown): value is number {
  return Number.isSafeInteger(value)
}

/** Writes the head, and settles once everything is written; throws where the browser took it back. */
async function finish(objects: IDBObjectStore, head: Head): Promise<void> {
  objects.put(head, headKey)
  await promisifyRequest(objects.transaction)
}
