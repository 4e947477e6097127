/** How an array is packed: item by item, or, where it lists objects, field by field. */
const ITEMS = 0
const COLUMNS = 1

/** The most fields that are worth a column each, so that lists of odd objects do not grow. */
const MAXIMUM_COLUMNS = 40

/** The most levels that are unpacked: more than any sheet has. */
const MAXIMUM_LEVELS = 200

/**
 * A JSON value turned so that like stands beside like, which deflate then says in far fewer bits: a
 * list of objects becomes a list of their fields and a column of values for each, null where an object
 * lacks the field. A mark before every array says how it is packed, so that `unpack` gives the same
 * value back, its fields in the same order.
 */
export function pack(value: unknown): unknown {
  if (Array.isArray(value)) return packList(value)
  return isObject(value) ? mapFields(value, pack) : value
}

/** The value that was packed. Throws a RangeError on what `pack` never makes. */
export function unpack(packed: unknown, level = 0): unknown {
  if (level > MAXIMUM_LEVELS) throw new RangeError('This is nested too deep.')
  if (isObject(packed)) return mapFields(packed, (value) => unpack(value, level + 1))
  if (!Array.isArray(packed)) return packed
  const [mark, ...rest]: readonly unknown[] = packed
  const parts = rest.map((part) => unpack(part, level + 1))
  if (mark === ITEMS) return parts
  if (mark === COLUMNS) return toRows(parts)
  throw new RangeError('This list has no mark.')
}

function packList(list: readonly unknown[]): unknown {
  const fields = commonFields(list)
  if (fields === undefined) return [ITEMS, ...list.map(pack)]
  const columns = fields.map((field) =>
    list.map((row) => (isObject(row) && Object.hasOwn(row, field) ? row[field] : null)),
  )
  return [COLUMNS, ...[fields, ...columns].map(packList)]
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
