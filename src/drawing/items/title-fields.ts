import { type Sheet, type SignatureKind, signatureOf, voidedSignatureOf } from '../../sheet'
import { formatFrequency } from '../text/quantity-text'

/** A field of the title block. */
export interface Field {
  readonly caption: string
  readonly value: string
}

const COLUMNS = 3

/**
 * The fields of a sheet below its title, row by row, named as ISO 7200 names them (from memory): what
 * the sheet fills, and always revision index, frequency with "rms", and sheet number.
 *
 * @param sheetNumber Which of how many sheets it is.
 */
export function fieldRowsOf(sheet: Sheet, sheetNumber = 'Sheet 1 of 1'): Field[][] {
  const job = sheet.job ?? {}
  const optional: [string, string | undefined][] = [
    ['Identification number', job.number],
    ['Date of issue', job.date],
    ['Supplementary title', job.circuit],
    ['Site', job.site],
    ['Creator', job.testedBy],
    ['Checked by', signedText(sheet, 'checked')],
    ['Approval person', signedText(sheet, 'approved')],
  ]
  const filled = optional.flatMap(([caption, value = '']) =>
    value.trim() === '' ? [] : [{ caption, value: value.trim() }],
  )
  const rows: Field[][] = []
  const columns = Math.ceil(filled.length / Math.ceil(filled.length / COLUMNS))
  for (let first = 0; first < filled.length; first += columns) {
    rows.push(filled.slice(first, first + columns))
  }
  const frequency = sheet.frequency && formatFrequency(sheet.frequency)
  rows.push([
    { caption: 'Revision index', value: sheet.revision?.trim() || '0' },
    { caption: 'Frequency and values', value: frequency ? `${frequency} · rms` : 'rms' },
    { caption: 'Sheet number', value: sheetNumber },
  ])
  return rows
}

/** Who signed and on which day, or whose signature no longer holds. */
function signedText(sheet: Sheet, kind: SignatureKind): string | undefined {
  const signature = signatureOf(sheet, kind)
  const voided = voidedSignatureOf(sheet, kind)
  if (signature === undefined) return voided && `VOID: ${voided.by}`
  return signature.date === undefined ? signature.by : `${signature.by}, ${signature.date}`
}
