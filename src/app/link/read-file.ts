import {
  extractSheetFromPdf,
  extractSheetText,
  isPdf,
  parseSheetText,
  type SheetResult,
} from '../../sheet'

const largestFile = 5_000_000
/** A print may be larger than the sheet that it carries. */
const largestPrint = 8 * largestFile
const tooLarge =
  'it is larger than 5 MB, and no sheet is. Choose a drawing or sheet that Phasogon saved.'

/** Reads the sheet in a file: its own JSON, an SVG or a PDF that carries it. */
export async function readFile(file: File): Promise<SheetResult> {
  if (file.size > largestPrint) return refusal(tooLarge)
  const bytes = await file.arrayBuffer().catch(() => undefined)
  if (bytes === undefined) return refusal('the browser could not read it. Choose it again.')
  return isPdf(new Uint8Array(bytes)) ? readPdf(new Uint8Array(bytes)) : readText(bytes)
}

function readPdf(bytes: Uint8Array): SheetResult {
  const carried = extractSheetFromPdf(bytes)
  if (carried !== undefined) return parseSheetText(carried)
  return refusal('it is a PDF that carries no sheet. Choose one that Phasogon saved.')
}

function readText(bytes: ArrayBuffer): SheetResult {
  if (bytes.byteLength > largestFile) return refusal(tooLarge)
  const text = new TextDecoder().decode(bytes)
  const carried = extractSheetText(text)
  if (carried === undefined && text.trimStart().startsWith('<')) {
    return refusal('it is a drawing that carries no sheet. Choose an SVG that Phasogon saved.')
  }
  return parseSheetText(carried ?? text)
}

function refusal(message: string): SheetResult {
  return { ok: false, errors: [{ path: '', message }] }
}
