import { MAXIMUM_DEPTH } from '../limits'
import { joinPath, type SheetError } from '../sheet-result'

/**
 * Finds what JSON cannot carry, anywhere in a value, also in fields that the schema does not know:
 * numbers that are not finite (1e400 reads as infinity), fields called `__proto__`, objects of a
 * class, and nesting that is too deep to write out again.
 */
export function* findUnplain(value: unknown, path = '', depth = 0): Generator<SheetError> {
  if (depth > MAXIMUM_DEPTH) {
    yield { path, message: `This is nested more than ${MAXIMUM_DEPTH} levels deep.` }
  } else if (Array.isArray(value)) {
    for (const [index, item] of value.entries()) {
      yield* findUnplain(item, joinPath(path, index), depth + 1)
    }
  } else if (typeof value === 'object' && value !== null) {
    yield* findUnplainFields(value, path, depth)
  } else {
    const message = problemOfAtom(value)
    if (message !== undefined) yield { path, message }
  }
}

function* findUnplainFields(value: object, path: string, depth: number): Generator<SheetError> {
  const prototype: unknown = Object.getPrototypeOf(value)
  if (prototype !== Object.prototype && prototype !== null) {
    yield { path, message: 'This must be a plain object, as JSON has it.' }
    return
  }
  for (const [key, item] of Object.entries(value)) {
    if (key === '__proto__') {
      yield { path: joinPath(path, key), message: 'No field may be called __proto__.' }
    } else {
      yield* findUnplain(item, joinPath(path, key), depth + 1)
    }
  }
}

function problemOfAtom(value: unknown): string | undefined {
  switch (typeof value) {
    case 'number':
      if (Number.isFinite(value)) return undefined
      return Number.isNaN(value)
        ? 'This is not a number.'
        : 'This number is too large: the largest that can be kept is about 1.8e308.'
    case 'string':
    case 'boolean':
      return undefined
    default:
      return value === null ? undefined : 'This is nothing that JSON can carry.'
  }
}
