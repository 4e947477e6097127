import { checksumOf } from './checksum'

/** Two bytes for how many there are, four for their checksum: eight characters of a link. */
const HEADER = 6

/** The most bytes that an envelope can hold. */
export const MAXIMUM_CONTENT = 0xffff

/** Bytes with their number and checksum before them. */
export function seal(content: Uint8Array): Uint8Array {
  const sealed = new Uint8Array(HEADER + content.length)
  const header = new DataView(sealed.buffer)
  header.setUint16(0, content.length)
  header.setUint32(2, checksumOf(content))
  sealed.set(content, HEADER)
  return sealed
}

/** The bytes that were sealed, without what stands behind them; or what happened to them. */
export function unseal(
  sealed: Uint8Array,
):
  | { readonly ok: true; readonly content: Uint8Array }
  | { readonly ok: false; readonly problem: 'cut' | 'altered' } {
  if (sealed.length < HEADER) return { ok: false, problem: 'cut' }
  const header = new DataView(sealed.buffer, sealed.byteOffset)
  const content = sealed.subarray(HEADER, HEADER + header.getUint16(0))
  if (content.length < header.getUint16(0)) return { ok: false, problem: 'cut' }
  if (checksumOf(content) !== header.getUint32(2)) return { ok: false, problem: 'altered' }
  return { ok: true, content }
}
