const ENTITIES: Readonly<Record<string, string>> = {
  lt: '<',
  gt: '>',
  amp: '&',
  quot: '"',
  apos: "'",
}

/**
 * The text of the sheet that an SVG drawing carries in its metadata; undefined where it carries none.
 * The drawing is read as plain text, so nothing in it is run, and `parseSheetText` has yet to judge
 * what is found.
 */
export function extractSheetText(svg: string): string | undefined {
  for (let end = 0; ; ) {
    const start = svg.indexOf('<metadata', end)
    const open = start < 0 ? -1 : svg.indexOf('>', start)
    const close = open < 0 ? -1 : svg.indexOf('</metadata', open)
    if (close < 0) return undefined
    const text = toPlainText(svg.slice(open + 1, close))
    const [from, to] = [text.indexOf('{'), text.lastIndexOf('}')]
    if (from >= 0 && to > from && text.includes('phasogon-sheet')) return text.slice(from, to + 1)
    end = close
  }
}

/** What is left of markup when its tags and comments are taken out and its entities are read. */
function toPlainText(markup: string): string {
  const pieces: string[] = []
  for (let at = 0; at < markup.length; ) {
    const special = SPECIAL.find(({ opens }) => markup.startsWith(opens, at))
    if (special !== undefined) {
      const from = at + special.opens.length
      const end = markup.indexOf(special.closes, from)
      const to = end < 0 ? markup.length : end
      if (special.isKept) pieces.push(markup.slice(from, to))
      at = to + special.closes.length
    } else {
      const next = markup.indexOf('<', at)
      const to = next < 0 ? markup.length : next
      pieces.push(readEntities(markup.slice(at, to)))
      at = to
    }
  }
  return pieces.join('')
}

/** What opens with "<", the longer openings first. */
const SPECIAL = [
  { opens: '<![CDATA[', closes: ']]>', isKept: true },
  { opens: '<!--', closes: '-->', isKept: false },
  { opens: '<', closes: '>', isKept: false },
] as const

function readEntities(text: string): string {
  return text.replace(/&(?:#(\d{1,7})|#[xX]([0-9a-fA-F]{1,6})|(\w{1,6}));/g, (whole, ...groups) => {
    const [decimal, hexadecimal, name]: readonly unknown[] = groups
    if (typeof name === 'string') return ENTITIES[name] ?? whole
    const code =
      typeof decimal === 'string' ? Number(decimal) : Number.parseInt(String(hexadecimal), 16)
    return code <= 0x10ffff ? String.fromCodePoint(code) : whole
  })
}
