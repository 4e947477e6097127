/** The tables of a typeface that a PDF needs (ISO 32000-1, 9.9), in the order in which they are written. */
const NEEDED = ['glyf', 'head', 'hhea', 'hmtx', 'loca', 'maxp'] as const
/** Where `head` says how `loca` is written, and what says that it is in whole bytes. */
const LOCA_FORMAT = 50
const LONG = 1
/** What the flags of a part of a compound letter mean (the OpenType specification, table glyf). */
const ARE_WORDS = 0x0001
const HAS_SCALE = 0x0008
const HAS_MORE = 0x0020
const HAS_TWO_SCALES = 0x0040
const HAS_MATRIX = 0x0080
/** How many bytes of a letter stand before its parts. */
const GLYPH_HEADER = 10

/**
 * A TrueType typeface with the outlines of some letters alone; all keep their numbers and widths. Much
 * faster than the library's own way, which copies what it has anew for every letter.
 *
 * @param font The bytes of a typeface with TrueType outlines.
 * @param glyphs The numbers of the letters; those that they are composed of are kept with them.
 */
export function subsetFont(font: Uint8Array, glyphs: Iterable<number>): Uint8Array {
  const tables = tablesOf(font)
  const places = placesOf(tables)
  const kept = withParts(tables.glyf, places, glyphs)
  const { outlines, loca } = packOutlines(tables.glyf, places, kept)
  const head = Uint8Array.from(tables.head)
  new DataView(head.buffer).setInt16(LOCA_FORMAT, LONG)
  return writeFont({ ...tables, glyf: outlines, head, loca })
}

type Tables = { readonly [tag in (typeof NEEDED)[number]]: Uint8Array }

function viewOf({ buffer, byteOffset, byteLength }: Uint8Array): DataView {
  return new DataView(buffer, byteOffset, byteLength)
}

function tablesOf(font: Uint8Array): Tables {
  const view = viewOf(font)
  const found = new Map<string, Uint8Array>()
  for (let at = 12; at < 12 + 16 * view.getUint16(4); at += 16) {
    const tag = String.fromCharCode(...font.subarray(at, at + 4))
    const offset = view.getUint32(at + 8)
    found.set(tag, font.subarray(offset, offset + view.getUint32(at + 12)))
  }
  const table = (tag: (typeof NEEDED)[number]) => {
    const bytes = found.get(tag)
    if (bytes === undefined) throw new Error(`The typeface has no table ${tag}.`)
    return bytes
  }
  return {
    glyf: table('glyf'),
    head: table('head'),
    hhea: table('hhea'),
    hmtx: table('hmtx'),
    loca: table('loca'),
    maxp: table('maxp'),
  }
}

/** Where the outline of each letter begins, and after the last one where that ends. */
function placesOf({ head, loca }: Tables): readonly number[] {
  const view = viewOf(loca)
  const isLong = viewOf(head).getInt16(LOCA_FORMAT) === LONG
  return Array.from({ length: loca.length / (isLong ? 4 : 2) }, (_, at) =>
    isLong ? view.getUint32(4 * at) : 2 * view.getUint16(2 * at),
  )
}

/** The letters with all that they are composed of. */
function withParts(
  glyf: Uint8Array,
  places: readonly number[],
  glyphs: Iterable<number>,
): ReadonlySet<number> {
  const kept = new Set<number>([0])
  const left = [...glyphs]
  for (let glyph = left.pop(); glyph !== undefined; glyph = left.pop()) {
    if (kept.has(glyph) && glyph !== 0) continue
    kept.add(glyph)
    const [from = 0, to = 0] = [places[glyph], places[glyph + 1]]
    if (to > from) left.push(...partsOf(viewOf(glyf.subarray(from, to))))
  }
  return kept
}

function partsOf(outline: DataView): number[] {
  const parts: number[] = []
  if (outline.getInt16(0) >= 0) return parts
  let at = GLYPH_HEADER
  for (let flags = HAS_MORE; (flags & HAS_MORE) !== 0; ) {
    flags = outline.getUint16(at)
    parts.push(outline.getUint16(at + 2))
    at += 4 + (flags & ARE_WORDS ? 4 : 2)
    at += flags & HAS_SCALE ? 2 : flags & HAS_TWO_SCALES ? 4 : flags & HAS_MATRIX ? 8 : 0
  }
  return parts
}

function packOutlines(
  glyf: Uint8Array,
  places: readonly number[],
  kept: ReadonlySet<number>,
): { readonly outlines: Uint8Array; readonly loca: Uint8Array } {
  const outlines = new Uint8Array(glyf.length)
  const loca = new Uint8Array(4 * places.length)
  const view = viewOf(loca)
  let end = 0
  for (let glyph = 0; glyph < places.length; glyph += 1) {
    view.setUint32(4 * glyph, end)
    if (!kept.has(glyph)) continue
    const outline = glyf.subarray(places[glyph], places[glyph + 1])
    outlines.set(outline, end)
    end += padded(outline.length)
  }
  return { outlines: outlines.subarray(0, end), loca }
}

/** Tables and outlines begin at whole words. */
function padded(length: number): number {
  return (length + 3) & ~3
}

function writeFont(tables: Tables): Uint8Array {
  const start = 12 + 16 * NEEDED.length
  const size = NEEDED.reduce((sum, tag) => sum + padded(tables[tag].length), start)
  const font = new Uint8Array(size)
  const view = viewOf(font)
  const power = Math.floor(Math.log2(NEEDED.length))
  view.setUint32(0, 0x00010000)
  view.setUint16(4, NEEDED.length)
  view.setUint16(6, 16 * 2 ** power)
  view.setUint16(8, power)
  view.setUint16(10, 16 * (NEEDED.length - 2 ** power))
  let offset = start
  NEEDED.forEach((tag, index) => {
    const bytes = tables[tag]
    const record = 12 + 16 * index
    font.set(bytes, offset)
    for (let at = 0; at < 4; at += 1) font[record + at] = tag.charCodeAt(at)
    view.setUint32(record + 4, checksumOf(font.subarray(offset, offset + padded(bytes.length))))
    view.setUint32(record + 8, offset)
    view.setUint32(record + 12, bytes.length)
    offset += padded(bytes.length)
  })
  return font
}

function checksumOf(table: Uint8Array): number {
  const view = viewOf(table)
  let sum = 0
  for (let at = 0; at < table.length; at += 4) sum = (sum + view.getUint32(at)) >>> 0
  return sum
}
