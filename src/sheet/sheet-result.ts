import type { Sheet } from './types'

/** One thing that is wrong with a sheet: where (`phasors[2].magnitude.value`; empty: the whole), and a sentence. */
export interface SheetError {
  readonly path: string
  readonly message: string
}

/** A valid sheet, or everything that is wrong with it (at most a hundred errors). */
export type SheetResult =
  | { readonly ok: true; readonly sheet: Sheet }
  | { readonly ok: false; readonly errors: readonly SheetError[] }

/** A result with a single error. */
export function sheetFailure(path: string, message: string): SheetResult {
  return { ok: false, errors: [{ path, message }] }
}

/** One line of text for a list of errors: the first with its place, and how many more there are. */
export function formatErrors(errors: readonly SheetError[]): string {
  const first = errors[0]
  if (first === undefined) return ''
  const place = first.path === '' ? '' : ` (${first.path})`
  const more = errors.length > 1 ? ` ${errors.length - 1} more like this.` : ''
  return `${first.message}${place}${more}`
}

/** Appends a key to a path: `phasors` + 2 → `phasors[2]`, then `label` → `phasors[2].label`. */
export function joinPath(path: string, key: string | number): string {
  if (typeof key === 'number') return `${path}[${key}]`
  if (!/^[A-Za-z_][A-Za-z0-9_]*$/.test(key)) return `${path}[${JSON.stringify(key.slice(0, 40))}]`
  return path === '' ? key : `${path}.${key}`
}
