import { deflateSync, inflateSync, strFromU8, strToU8 } from 'fflate'
import { failure, type Result, success } from '../core'
import { toCanonical } from './canonical'
import { MAXIMUM_INFLATED_BYTES, MAXIMUM_LINK_LENGTH } from './limits'
import { fromBase64Url, toBase64Url } from './link/base64url'
import { DICTIONARY_1 } from './link/dictionary-1'
import { seal, unseal } from './link/envelope'
import { findLink } from './link/find-link'
import { pack, unpack } from './link/pack'
import { parseSheet } from './parse-sheet'
import { type SheetResult, sheetFailure } from './sheet-result'
import type { Sheet } from './types'

const VERSION = 1
const dictionary = strToU8(DICTIONARY_1)

/**
 * The fragment of an address that carries the whole sheet: `#sheet=1.` and base64url of its JSON,
 * packed and deflated against a dictionary that never changes for this version. One that is longer
 * than `MAXIMUM_LINK_LENGTH` cannot be read again: such a sheet goes as a file.
 */
export function serializeLink(sheet: Sheet): string {
  const json = strToU8(JSON.stringify(pack(toCanonical(sheet))))
  const content = deflateSync(json, { level: 9, mem: 12, dictionary })
  return `#sheet=${VERSION}.${toBase64Url(seal(content))}`
}

const NO_LINK =
  'There is no sheet in this text: a link to one ends in #sheet= and a long row of letters. Copy the whole link.'
const CUT =
  'This link is cut short: its end is missing. Copy the whole link, or ask for the sheet as a file.'
const ALTERED =
  'This link was altered on its way: some of its letters are not what they were. Copy it again, or ask for the sheet as a file.'
const NEWER =
  'This link was made by a newer version of the program: open it there, or bring this one up to date.'
const UNKNOWN = 'This link has a form that no version of the program has made. Copy it again.'
const TOO_LONG = 'This link is too long to be one of a sheet. Ask for the sheet as a file.'
const TOO_LARGE = 'What this link holds is too large for a sheet, so it was not opened.'
const NOT_A_SHEET = 'This link does not hold a sheet. Ask for the sheet as a file.'

/**
 * The sheet that a link carries, wherever the link stands in a text and whatever host it names: only
 * the fragment is read. Otherwise what is wrong with it, in a sentence; where it holds something that
 * is no valid sheet, each error names the path. Never throws, and inflates no more than 1 MB.
 */
export function parseLink(text: string): SheetResult {
  const found = findLink(text.slice(0, 4 * MAXIMUM_LINK_LENGTH))
  if (found === undefined) return sheetFailure('', /sheet=/.test(text) ? CUT : NO_LINK)
  if (found.version > VERSION) return sheetFailure('', NEWER)
  if (found.version < VERSION) return sheetFailure('', UNKNOWN)
  if (found.payload.length > MAXIMUM_LINK_LENGTH) return sheetFailure('', TOO_LONG)
  const content = contentOf(found.payload, found.joined)
  if (!content.ok) return sheetFailure('', content.problem)
  const sheet = open(content.value)
  return sheet.ok ? parseSheet(sheet.value) : sheetFailure('', sheet.problem)
}

function contentOf(payload: string, joined: string): Result<Uint8Array> {
  const direct = unseal(fromBase64Url(payload))
  if (direct.ok) return success(direct.content)
  const mended = unseal(fromBase64Url(joined.slice(0, MAXIMUM_LINK_LENGTH)))
  if (mended.ok) return success(mended.content)
  return failure(direct.problem === 'cut' ? CUT : ALTERED)
}

function open(content: Uint8Array): Result<unknown> {
  const json = inflate(content)
  if (!json.ok) return json
  try {
    return success(unpack(JSON.parse(json.value)))
  } catch {
    return failure(NOT_A_SHEET)
  }
}

/** Inflates into a space of fixed size, so that a few bytes cannot claim gigabytes. */
function inflate(content: Uint8Array): Result<string> {
  const space = new Uint8Array(MAXIMUM_INFLATED_BYTES + 1)
  try {
    const bytes = inflateSync(content, { dictionary, out: space })
    return bytes.length > MAXIMUM_INFLATED_BYTES ? failure(TOO_LARGE) : success(strFromU8(bytes))
  } catch (error) {
    return failure(error instanceof RangeError ? TOO_LARGE : NOT_A_SHEET)
  }
}
