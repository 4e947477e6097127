import { Inflate, strFromU8 } from 'fflate'
import { MAXIMUM_FILE_BYTES } from './limits'

/** How much of a PDF is looked at for what stands before a stream, in bytes. */
const LONGEST_DICTIONARY = 2_000
const STREAM = 'stream'
const END = 'endstream'

/**
 * The text of the sheet that a PDF carries as an attached file; undefined where it carries none. Nothing
 * in the PDF is run, what is packed is unpacked to no more than a sheet may be long, and
 * `parseSheetText` has yet to judge what is found.
 */
export function extractSheetFromPdf(bytes: Uint8Array): string | undefined {
  // A character a byte: offsets in the text are those in the bytes.
  const text = strFromU8(bytes, true)
  const streams = [...streamsIn(text)]
  // A program that wrote the PDF anew may call the attachment something else.
  const likeliest = streams.toSorted((one, other) => Number(isFile(other)) - Number(isFile(one)))
  for (const { dictionary, from, to } of likeliest) {
    const content = unpack(bytes.subarray(from, to), dictionary)
    if (content && isSheet(content)) return strFromU8(content)
  }
  return undefined
}

/** Whether bytes are those of a PDF. */
export function isPdf(bytes: Uint8Array): boolean {
  return strFromU8(bytes.subarray(0, 1024), true).includes('%PDF-')
}

interface Stream {
  readonly dictionary: string
  readonly from: number
  readonly to: number
}

function* streamsIn(text: string): Generator<Stream> {
  for (let at = text.indexOf(STREAM); at >= 0; at = text.indexOf(STREAM, at)) {
    const line = /^\r?\n/.exec(text.slice(at + STREAM.length, at + STREAM.length + 2))
    if (line === null || text.slice(at - 3, at) === 'end') {
      at += STREAM.length
      continue
    }
    const start = Math.max(text.lastIndexOf('obj', at), at - LONGEST_DICTIONARY)
    const dictionary = text.slice(start, at)
    const from = at + STREAM.length + line[0].length
    const to = endByLength(dictionary, from, text) ?? endByWord(from, text)
    if (to === undefined) return
    yield { dictionary, from, to }
    at = text.indexOf(END, to) + END.length
  }
}

/** Where a stream ends as its dictionary says; undefined where that is not so, or stands elsewhere. */
function endByLength(dictionary: string, from: number, text: string): number | undefined {
  const length = /\/Length\s+(\d{1,9})(?!\d|\s+\d+\s+R)/.exec(dictionary)?.[1]
  const to = from + Number(length)
  return /^\s{0,2}endstream/.test(text.slice(to, to + 12)) ? to : undefined
}

/** Where a stream ends by the word behind it, and the line end before that. */
function endByWord(from: number, text: string): number | undefined {
  const end = text.indexOf(END, from)
  if (end < 0) return undefined
  return end - (/\r?\n$/.exec(text.slice(end - 2, end))?.[0].length ?? 0)
}

function isFile({ dictionary }: Stream): boolean {
  return dictionary.includes('/EmbeddedFile')
}

function isSheet(content: Uint8Array): boolean {
  const start = strFromU8(content.subarray(0, 400), true)
  return /^\s*\{/.test(start) && start.includes('phasogon-sheet')
}

/** What a stream holds; undefined where it is packed in a way that no attachment needs, or spoiled. */
function unpack(bytes: Uint8Array, dictionary: string): Uint8Array | undefined {
  const filters = /\/Filter\s*(\[[^\]]*\]|\/\w+)/.exec(dictionary)?.[1] ?? ''
  if (filters === '') return bytes.length > MAXIMUM_FILE_BYTES ? undefined : bytes
  if (!/^(\[\s*)?\/FlateDecode\s*\]?$/.test(filters)) return undefined
  return inflate(bytes)
}

function inflate(bytes: Uint8Array): Uint8Array | undefined {
  const parts: Uint8Array[] = []
  let size = 0
  const stream = new Inflate((part) => {
    size += part.length
    if (size > MAXIMUM_FILE_BYTES) throw new Error('More than a sheet may be.')
    parts.push(part)
  })
  try {
    // Two bytes of a header stand before what is deflated (RFC 1950).
    stream.push(bytes.subarray(2), false)
    stream.push(new Uint8Array(0), true)
  } catch {
    // The checksum behind the end is not part of it: what came is judged by whether it is a sheet.
  }
  if (size > MAXIMUM_FILE_BYTES) return undefined
  const whole = new Uint8Array(size)
  let at = 0
  for (const part of parts) {
    whole.set(part, at)
    at += part.length
  }
  return whole
}
