import { inflateSync } from 'node:zlib'
import { getDocumentProxy } from 'unpdf'

/** What an independent reader finds in a PDF. */
export interface Found {
  /** Width and height of each page in millimetres. */
  readonly sizes: readonly (readonly [number, number])[]
  /** The text of each page, as it is copied. */
  readonly texts: readonly string[]
  /** The names of the files that are attached. */
  readonly attached: readonly string[]
}

const MILLIMETRES = 25.4 / 72

/** Reads a PDF with a library that knows nothing of the one that wrote it. */
export async function readPdf(bytes: Uint8Array): Promise<Found> {
  const document = await getDocumentProxy(bytes.slice(), { verbosity: 0 })
  const sizes: [number, number][] = []
  const texts: string[] = []
  for (let number = 1; number <= document.numPages; number += 1) {
    const page = await document.getPage(number)
    const [left = 0, bottom = 0, right = 0, top = 0] = page.view
    sizes.push([(right - left) * MILLIMETRES, (top - bottom) * MILLIMETRES])
    const { items } = await page.getTextContent()
    texts.push(items.flatMap((item) => ('str' in item ? [item.str] : [])).join('\n'))
  }
  const attached: unknown = await document.getAttachments()
  const names = attached instanceof Map ? [...attached.keys()].map(String) : []
  return { sizes, texts, attached: names }
}

/** The streams of a PDF, unpacked, as text of a character a byte; those that are no deflated text left out. */
export function streamsOf(bytes: Uint8Array): readonly string[] {
  const text = Buffer.from(bytes).toString('latin1')
  return [...text.matchAll(/\/FlateDecode[\s\S]*?\bstream\r?\n/g)].flatMap((match) => {
    const from = match.index + match[0].length
    const packed = bytes.subarray(from, text.indexOf('endstream', from))
    try {
      return [inflateSync(packed).toString('latin1')]
    } catch {
      return []
    }
  })
}

/** A straight stroke in a page's content: where it begins and ends, in millimetres from the lower left. */
export type Stroke = readonly [x1: number, y1: number, x2: number, y2: number]

/** The straight strokes that are drawn in a stream of a page (ISO 32000-1, 8.5.2). */
export function strokesIn(content: string): readonly Stroke[] {
  const number = '(-?\\d+\\.?\\d*)'
  const stroke = new RegExp(`${number} ${number} m\\s+${number} ${number} l`, 'g')
  return [...content.matchAll(stroke)].map(([, ...figures]) => {
    const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = figures.map((figure) => Number(figure) * MILLIMETRES)
    return [x1, y1, x2, y2] as const
  })
}
