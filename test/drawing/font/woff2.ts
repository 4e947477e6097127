import { readFileSync } from 'node:fs'
import { brotliDecompressSync } from 'node:zlib'

/** The tags that a WOFF2 directory gives by number (WOFF File Format 2.0, section 4.1). */
const KNOWN_TAGS = (
  'cmap head hhea hmtx maxp name OS/2 post cvt  fpgm glyf loca prep CFF  VORG EBDT EBLC gasp hdmx kern ' +
  'LTSH PCLT VDMX vhea vmtx BASE GDEF GPOS GSUB EBSC JSTF MATH CBDT CBLC COLR CPAL SVG  sbix acnt avar ' +
  'bdat bloc bsln cvar fdsc feat fmtx fvar gvar hsty just lcar mort morx opbd prop trak Zapf Silf Glat ' +
  'Gloc Feat Sill'
).match(/.{4} ?/g) as string[]

/** What a font says of its characters' widths. */
export interface Widths {
  readonly unitsPerEm: number
  readonly advances: ReadonlyMap<number, number>
}

/** Reads the advance widths of a WOFF2 file from its own tables. */
export function readWidths(file: string): Widths {
  const tables = tablesOf(readFileSync(file))
  const [head, hhea, hmtx, cmap] = ['head', 'hhea', 'hmtx', 'cmap'].map((tag) => {
    const table = tables.get(tag)
    if (!table) throw new Error(`${file} has no ${tag}.`)
    return table
  }) as [DataView, DataView, DataView, DataView]
  const longMetrics = hhea.getUint16(34)
  const advances = new Map<number, number>()
  for (const [character, glyph] of charactersOf(cmap)) {
    advances.set(character, hmtx.getUint16(4 * Math.min(glyph, longMetrics - 1)))
  }
  return { unitsPerEm: head.getUint16(18), advances }
}

function tablesOf(bytes: Buffer): Map<string, DataView> {
  const count = bytes.readUInt16BE(12)
  const compressed = bytes.readUInt32BE(20)
  let at = 48
  const number = () => {
    let value = 0
    for (;;) {
      const byte = bytes[at] ?? 0
      at += 1
      value = value * 128 + (byte & 127)
      if (byte < 128) return value
    }
  }
  const entries = Array.from({ length: count }, () => {
    const flags = bytes[at] ?? 0
    at += 1
    let tag = KNOWN_TAGS[flags & 63]?.slice(0, 4) ?? ''
    if ((flags & 63) === 63) {
      tag = bytes.toString('latin1', at, at + 4)
      at += 4
    }
    const version = flags >> 6
    const length = number()
    const isOutline = tag === 'glyf' || tag === 'loca'
    const isTransformed = isOutline ? version !== 3 : version !== 0
    if (tag === 'hmtx' && isTransformed) throw new Error('The widths are packed.')
    return { tag, length: isTransformed ? number() : length }
  })
  const data = brotliDecompressSync(bytes.subarray(at, at + compressed))
  const tables = new Map<string, DataView>()
  let offset = data.byteOffset
  for (const { tag, length } of entries) {
    tables.set(tag, new DataView(data.buffer, offset, length))
    offset += length
  }
  return tables
}

/** The characters of a Unicode subtable of format 4 and their glyphs (OpenType, cmap). */
function* charactersOf(cmap: DataView): Generator<[number, number]> {
  const start = Array.from({ length: cmap.getUint16(2) }, (_, index) =>
    cmap.getUint32(4 + 8 * index + 4),
  ).find((offset) => cmap.getUint16(offset) === 4)
  if (start === undefined) throw new Error('There is no table of format 4.')
  const doubled = cmap.getUint16(start + 6)
  const [ends, starts] = [start + 14, start + 16 + doubled]
  const [deltas, offsets] = [starts + doubled, starts + 2 * doubled]
  for (let at = 0; at < doubled; at += 2) {
    const [first, last] = [cmap.getUint16(starts + at), cmap.getUint16(ends + at)]
    const offset = cmap.getUint16(offsets + at)
    for (let character = first; character <= last && character !== 0xffff; character += 1) {
      const place = offsets + at + offset + 2 * (character - first)
      const raw = offset === 0 ? character : cmap.getUint16(place)
      if (raw !== 0) yield [character, (raw + cmap.getInt16(deltas + at)) & 0xffff]
    }
  }
}
