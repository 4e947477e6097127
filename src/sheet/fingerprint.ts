import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex } from '@noble/hashes/utils.js'
import { strToU8 } from 'fflate'
import { toCanonical } from './canonical'
import { signedPartOf } from './signed-part'
import type { Sheet } from './types'

/**
 * A short name for the data of a sheet, in groups of four as a voice reads them out: `3f2a 91c0 7be4`. It
 * is the beginning of the SHA-256 of the sheet's canonical JSON, without the signatures and the paper, so
 * that whoever checks and whoever approves find on their print what the tester had on his.
 */
export function fingerprintOf(sheet: Sheet): string {
  const text = JSON.stringify(toCanonical(signedPartOf(sheet)))
  return bytesToHex(sha256(strToU8(text)))
    .slice(0, 12)
    .replace(/....(?=.)/g, '$& ')
}
