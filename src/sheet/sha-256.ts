/** The first `count` primes. */
function primes(count: number): readonly number[] {
  const found: number[] = []
  for (let candidate = 2; found.length < count; candidate += 1) {
    if (found.every((prime) => candidate % prime !== 0)) found.push(candidate)
  }
  return found
}

/** The first 32 bits of the fraction of a number. */
function fractionBits(value: number): number {
  return Math.floor((value - Math.floor(value)) * 2 ** 32) | 0
}

const START = primes(8).map((prime) => fractionBits(Math.sqrt(prime)))
const ROUNDS = primes(64).map((prime) => fractionBits(Math.cbrt(prime)))

/** Bytes in a block. */
const BLOCK = 64

/**
 * SHA-256 of the bytes as 64 hexadecimal digits, as FIPS 180-4 defines it. It is worked out here because
 * what the runtimes offer answers later, and the sheet is drawn at once.
 */
export function sha256(bytes: Uint8Array): string {
  const blocks = padded(bytes)
  const words = new Int32Array(BLOCK)
  let state: readonly number[] = START
  for (let at = 0; at < blocks.byteLength; at += BLOCK) {
    for (let word = 0; word < 16; word += 1) words[word] = blocks.getInt32(at + 4 * word)
    state = compressed(state, words)
  }
  return state.map((word) => (word >>> 0).toString(16).padStart(8, '0')).join('')
}

/** The message, a single bit, zeros, and the length in bits in the last eight bytes of a block. */
function padded(bytes: Uint8Array): DataView {
  const blocks = new Uint8Array(Math.ceil((bytes.length + 9) / BLOCK) * BLOCK)
  blocks.set(bytes)
  blocks[bytes.length] = 0x80
  const view = new DataView(blocks.buffer)
  view.setBigUint64(blocks.length - 8, BigInt(bytes.length) * 8n)
  return view
}

function turned(word: number, bits: number): number {
  return (word >>> bits) | (word << (32 - bits))
}

/** The state after a block; `words` holds its sixteen words and has room for the schedule. */
function compressed(state: readonly number[], words: Int32Array): readonly number[] {
  const wordAt = (at: number) => words[at] ?? 0
  for (let at = 16; at < BLOCK; at += 1) {
    const [early, late] = [wordAt(at - 15), wordAt(at - 2)]
    const small = turned(early, 7) ^ turned(early, 18) ^ (early >>> 3)
    const large = turned(late, 17) ^ turned(late, 19) ^ (late >>> 10)
    words[at] = wordAt(at - 16) + small + wordAt(at - 7) + large
  }
  let [a = 0, b = 0, c = 0, d = 0, e = 0, f = 0, g = 0, h = 0]: number[] = [...state]
  for (let at = 0; at < BLOCK; at += 1) {
    const choice = (e & f) ^ (~e & g)
    const majority = (a & b) ^ (a & c) ^ (b & c)
    const lower = turned(e, 6) ^ turned(e, 11) ^ turned(e, 25)
    const upper = turned(a, 2) ^ turned(a, 13) ^ turned(a, 22)
    const one = (h + lower + choice + (ROUNDS[at] ?? 0) + wordAt(at)) | 0
    ;[h, g, f, e, d, c, b, a] = [g, f, e, (d + one) | 0, c, b, a, (one + upper + majority) | 0]
  }
  return [a, b, c, d, e, f, g, h].map((word, at) => (word + (state[at] ?? 0)) | 0)
}
