/** The polynomial of CRC-32 (ISO 3309, as in ZIP and PNG), lowest power first. */
const POLYNOMIAL = 0xedb88320

/** CRC-32 of the bytes, as an unsigned 32-bit number: it tells a link that was altered by accident. */
export function checksumOf(bytes: Uint8Array): number {
  let remainder = 0xffffffff
  for (const byte of bytes) {
    remainder ^= byte
    for (let bit = 0; bit < 8; bit += 1) {
      remainder = remainder & 1 ? (remainder >>> 1) ^ POLYNOMIAL : remainder >>> 1
    }
  }
  return (remainder ^ 0xffffffff) >>> 0
}
