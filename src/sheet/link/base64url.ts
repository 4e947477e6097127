const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789-_'

/** Bytes as text that survives in an address: base64url of RFC 4648, without padding. */
export function toBase64Url(bytes: Uint8Array): string {
  let text = ''
  for (let at = 0; at < bytes.length; at += 3) {
    const group = ((bytes[at] ?? 0) << 16) | ((bytes[at + 1] ?? 0) << 8) | (bytes[at + 2] ?? 0)
    const length = Math.min(bytes.length - at, 3) + 1
    for (let place = 0; place < length; place += 1) {
      text += ALPHABET.charAt((group >> (18 - 6 * place)) & 63)
    }
  }
  return text
}

/** The bytes of base64url text, as many as are whole. Other characters must not be in it. */
export function fromBase64Url(text: string): Uint8Array {
  const bytes = new Uint8Array(Math.floor((text.length * 3) / 4))
  let group = 0
  let bits = 0
  let length = 0
  for (const character of text) {
    group = ((group << 6) | ALPHABET.indexOf(character)) & 0xffff
    bits += 6
    if (bits < 8) continue
    bits -= 8
    bytes[length] = (group >> bits) & 255
    length += 1
  }
  return bytes
}
