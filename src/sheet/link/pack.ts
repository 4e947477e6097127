/** How a list is packed. */
const ITEMS = 0
/** A list of objects: the list of their fields, then a list of values for each. */
const COLUMNS = 1
/** A list of numbers, in one text. */
const NUMBERS = 2
/** A list of words, in one text. Within columns, which are lists, the text stands alone. */
const WORDS = 3

/** Stands between words and numbers; where there is nothing between two of them, that one is null. */
const SEPARATOR = '|'

/** The most fields that are worth a column each, so that lists of odd objects do not grow. */
const MAXIMUM_COLUMNS = 40

/** The most levels that are unpacked: more than any sheet has. */
const MAXIMUM_LEVELS = 200

/**
 * A JSON value turned so that like stands beside like, which deflate then says in fewer bits: a list of
 * objects becomes columns, one a field, null where an object lacks it; a list of words or numbers
 * becomes one text. A mark before every list says how it is packed, so that `unpack` gives the same
 * value back, its fields in the same order.
 */
export function pack(value: unknown): unknown {
  if (isList(value)) return packList(value)
  return isObject(value) ? mapFields(value, pack) : value
}

/** The value that was packed. Throws a RangeError on what `pack` never makes. */
export function unpack(packed: unknown, level = 0): unknown {
  if (level > MAXIMUM_LEVELS) throw new RangeError('This is nested too deep.')
  if (isObject(packed)) return mapFields(packed, (value) => unpack(value, level + 1))
  if (!isList(packed)) return packed
  const [mark, ...parts] = packed
  if (mark === WORDS) return split(parts[0])
  if (mark === NUMBERS) return split(parts[0]).map((word) => (word === null ? null : Number(word)))
  if (mark === ITEMS) return parts.map((part) => unpack(part, level + 1))
  if (mark === COLUMNS) return toRows(parts.map((part) => unpackColumn(part, level + 1)))
  throw new RangeError('This list has no mark.')
}

function packList(list: readonly unknown[]): unknown {
  const fields = commonFields(list)
  if (fields !== undefined) {
    const columns = fields.map((field) =>
      list.map((row) => (isObject(row) && Object.hasOwn(row, field) ? row[field] : null)),
    )
    return [COLUMNS, ...[fields, ...columns].map(packColumn)]
  }
  if (list.length > 0 && list.every((item) => item === null || isWord(item))) {
    return [WORDS, join(list)]
  }
  if (list.length > 0 && list.every((item) => item === null || typeof item === 'number')) {
    return [NUMBERS, join(list)]
  }
  return [ITEMS, ...list.map(pack)]
}

function packColumn(column: readonly unknown[]): unknown {
  const packed = packList(column)
  return isList(packed) && packed[0] === WORDS ? packed[1] : packed
}

function unpackColumn(packed: unknown, level: number): unknown {
  return unpack(isList(packed) ? packed : [WORDS, packed], level)
}

/**
 * The fields of all the objects in a list, in an order in which each of them has its own. Undefined
 * where there is no such order, or where columns could not tell the list from another.
 */
function commonFields(list: readonly unknown[]): readonly string[] | undefined {
  const fields: string[] = []
  for (const row of list) {
    if (row === null) continue
    if (!isObject(row) || Object.keys(row).length === 0) return undefined
    let after = 0
    for (const [field, value] of Object.entries(row)) {
      const at = fields.indexOf(field)
      if (value === null || (at >= 0 && at < after)) return undefined
      if (at < 0) fields.splice(after, 0, field)
      after = (at < 0 ? after : at) + 1
    }
    if (fields.length > MAXIMUM_COLUMNS) return undefined
  }
  return fields.length === 0 ? undefined : fields
}

function toRows([fields, ...columns]: readonly unknown[]): unknown {
  if (!isList(fields) || !columns.every(isList) || columns.length !== fields.length) {
    throw new RangeError('These columns have no heads.')
  }
  const length = columns[0]?.length ?? 0
  // Columns of one length make no more cells than there are characters: nothing can swell here.
  if (columns.some((column) => column.length !== length)) {
    throw new RangeError('These columns are not of one length.')
  }
  return Array.from({ length }, (_, row) => {
    const cells = columns.map((column, at) => [String(fields[at]), column[row]] as const)
    const present = cells.filter(([, value]) => value !== null)
    return present.length === 0 ? null : Object.fromEntries(present)
  })
}

function join(list: readonly unknown[]): string {
  return list.map((item) => (item === null ? '' : String(item))).join(SEPARATOR)
}

function split(text: unknown): readonly (string | null)[] {
  if (typeof text !== 'string') throw new RangeError('This list is not one text.')
  return text.split(SEPARATOR).map((word) => (word === '' ? null : word))
}

function isWord(value: unknown): boolean {
  return typeof value === 'string' && value !== '' && !value.includes(SEPARATOR)
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}

function isList(value: unknown): value is readonly unknown[] {
  return Array.isArray(value)
}

function mapFields(
  object: Readonly<Record<string, unknown>>,
  change: (value: unknown) => unknown,
): Readonly<Record<string, unknown>> {
  return Object.fromEntries(Object.entries(object).map(([field, value]) => [field, change(value)]))
}
