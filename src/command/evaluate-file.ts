import { readFile, stat } from 'node:fs/promises'
import {
  type Evaluation,
  extractSheetFromPdf,
  extractSheetText,
  fingerprintOf,
  isPdf,
  MAXIMUM_FILE_BYTES,
  parseSheetText,
  type SheetError,
  type SheetResult,
} from '../sheet'
import { evaluate } from '../sheet/estimate'
import { linesOf } from './evaluate-lines'

/** Where a sheet stands: the file as it was named and, among many sheets, the line, counted from 1. */
interface Origin {
  readonly file: string
  readonly line?: number
}

/** One line of output: what the program says of a sheet, or what is wrong with it. */
export type Answer = Origin & (Evaluation | { readonly errors: readonly SheetError[] })

/** An answer with the title of its sheet, which is empty where there is none, and its fingerprint. */
export interface Evaluated {
  readonly title: string
  readonly fingerprint?: string
  readonly answer: Answer
}

/**
 * Evaluates the sheets of a file, in order: one in a JSON file, in the metadata of an SVG drawing or
 * attached to a PDF, one a line in a file that ends in `.jsonl`, blank lines passed over. `file` is how
 * the answers name it, `path` where it lies. A file that cannot be read is answered like a sheet that is not valid.
 */
export async function* evaluateFile(file: string, path: string): AsyncGenerator<Evaluated> {
  try {
    if (path.toLowerCase().endsWith('.jsonl')) yield* evaluateLines(file, path)
    else yield answerTo({ file }, await readSheet(path))
  } catch (error) {
    const errors = [{ path: '', message: whyUnreadable(error) }]
    yield { title: '', answer: { file, errors } }
  }
}

async function* evaluateLines(file: string, path: string): AsyncGenerator<Evaluated> {
  let line = 0
  for await (const text of linesOf(path)) {
    line += 1
    if (text.trim() !== '') yield answerTo({ file, line }, parseSheetText(text))
  }
}

/** A drawing may be larger than the sheet that it carries: its lines and labels come on top. */
const LARGEST_DRAWING = 8 * MAXIMUM_FILE_BYTES

async function readSheet(path: string): Promise<SheetResult> {
  const { size } = await stat(path)
  if (size > LARGEST_DRAWING)
    return refusal('This is too large for a sheet: at most 5 MB are read.')
  const bytes = await readFile(path)
  if (isPdf(bytes)) return parsed(extractSheetFromPdf(bytes), 'print')
  const text = bytes.toString('utf8')
  if (!text.trimStart().startsWith('<')) return parseSheetText(text)
  return parsed(extractSheetText(text), 'drawing')
}

function parsed(carried: string | undefined, what: 'print' | 'drawing'): SheetResult {
  return carried === undefined
    ? refusal(`This ${what} carries no sheet: open the sheet it was made from and save it again.`)
    : parseSheetText(carried)
}

function refusal(message: string): SheetResult {
  return { ok: false, errors: [{ path: '', message }] }
}

function answerTo(origin: Origin, result: SheetResult): Evaluated {
  if (!result.ok) return { title: '', answer: { ...origin, errors: result.errors } }
  const { sheet } = result
  return {
    title: sheet.title,
    fingerprint: fingerprintOf(sheet),
    answer: { ...origin, ...evaluate(sheet) },
  }
}

const REASONS: { readonly [code: string]: string } = {
  ENOENT: 'There is no such file.',
  ENOTDIR: 'There is no such file.',
  EISDIR: 'This is a folder, not a file.',
  EACCES: 'This file may not be read: ask its owner for leave.',
}

/** Why the system would not give a file. Anything else that was thrown is no fault of the file. */
function whyUnreadable(error: unknown): string {
  if (!(error instanceof Error) || !('code' in error)) throw error
  const code = String(error.code)
  return REASONS[code] ?? `This file cannot be read (${code}).`
}
