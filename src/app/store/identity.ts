import type { Copy, Identity } from './state'

const letters = 'abcdefghijklmnopqrstuvwxyz0123456789'

/** A name that no other sheet or page has, whatever the device: fourteen random letters and digits. */
export function createName(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(14))
  return Array.from(bytes, (byte) => letters[byte % letters.length]).join('')
}

/** The identity of a sheet that was not here before. */
export function createIdentity(copy?: Copy): Identity {
  return { id: createName(), ...(copy && { copy }) }
}
