/** What stands in a link: the version of its form, and the characters that hold the sheet. */
export interface FoundLink {
  readonly version: number
  /** As they stand in one run. */
  readonly payload: string
  /** What they may be if a mail program broke the link over several lines. */
  readonly joined: string
}

const MARK = /sheet=(\d{1,6})\.([A-Za-z0-9_-]*)/
const PERCENT_ENCODED: Readonly<Record<string, string>> = {
  '%23': '#',
  '%3D': '=',
  '%2E': '.',
  '%2D': '-',
  '%5F': '_',
}
/** Line ends with what mail programs put around them, spaces, and marks that have no width. */
const BETWEEN_LINES = /=?\r?\n[>\s]*|\s+|[\u00ad\u200b-\u200d\u2060\ufeff]/g

/**
 * Finds the part of a link that carries a sheet, in any text: whatever the host, between angle
 * brackets, with punctuation behind it, percent-encoded or broken over lines. Undefined where there is
 * none.
 */
export function findLink(text: string): FoundLink | undefined {
  const plain = text.replace(
    /%(?:23|3D|2E|2D|5F)/gi,
    (code) => PERCENT_ENCODED[code.toUpperCase()] ?? code,
  )
  const found = MARK.exec(plain)
  if (found === null) return undefined
  const [whole, version = '', payload = ''] = found
  const rest = plain.slice(found.index + whole.length).replace(BETWEEN_LINES, '')
  const continued = /^[A-Za-z0-9_-]*/.exec(rest)?.[0] ?? ''
  return { version: Number(version), payload, joined: payload + continued }
}
