const ENTITIES: Readonly<Record<string, string>> = {
  lt: '<',
  gt: '>',
  amp: '&',
  quot: '"',
  apos: "'",
}

/** What opens with "<", the longer openings first; only the text of sections counts. */
const MARKUP = [
  { opens: '<![CDATA[', closes: ']]>', isText: true },
  { opens: '<!--', closes: '-->', isText: false },
  { opens: '<', closes: '>', isText: false },
] as const

const START = '<metadata'
const END = '</metadata'

/**
 * The text of the sheet that an SVG drawing carries in its metadata; undefined where it carries none.
 * The drawing is read as plain text, so nothing in it is run, and `parseSheetText` has yet to judge
 * what is found.
 */
export function extractSheetText(svg: string): string | undefined {
  for (let at = 0; ; ) {
    const start = svg.indexOf(START, at)
    const open = start < 0 ? -1 : svg.indexOf('>', start)
    const found = open < 0 ? undefined : textUntil(svg, open + 1, END)
    if (found === undefined) return undefined
    const { text, end } = found
    const [from, to] = [text.indexOf('{'), text.lastIndexOf('}')]
    if (text.includes('phasogon-sheet') && from >= 0 && to > from) return text.slice(from, to + 1)
    at = end
  }
}

/** The text in markup from a place up to a tag, other tags and comments left out; undefined where that tag never comes. */
function textUntil(
  markup: string,
  start: number,
  tag: string,
): { readonly text: string; readonly end: number } | undefined {
  const pieces: string[] = []
  for (let at = start; at < markup.length; ) {
    if (markup.startsWith(tag, at)) return { text: pieces.join(''), end: at }
    const found = MARKUP.find(({ opens }) => markup.startsWith(opens, at))
    const from = at + (found?.opens.length ?? 0)
    const end = markup.indexOf(found?.closes ?? '<', from)
    const to = end < 0 ? markup.length : end
    if (found === undefined) pieces.push(readEntities(markup.slice(from, to)))
    else if (found.isText) pieces.push(markup.slice(from, to))
    at = to + (found?.closes.length ?? 0)
  }
  return undefined
}

function readEntities(text: string): string {
  return text.replace(/&(?:#(\d{1,7})|#[xX]([0-9a-fA-F]{1,6})|(\w{1,6}));/g, (whole, ...groups) => {
    const [decimal, hexadecimal, name]: readonly unknown[] = groups
    if (typeof name === 'string') return ENTITIES[name] ?? whole
    const code =
      typeof decimal === 'string' ? Number(decimal) : Number.parseInt(String(hexadecimal), 16)
    return code <= 0x10ffff ? String.fromCodePoint(code) : whole
  })
}
