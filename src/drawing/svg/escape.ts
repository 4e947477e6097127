/** Characters that XML 1.0 (section 2.2) does not allow, lone halves of pairs among them. */
const NOT_IN_XML = /[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu
const ESCAPES: { readonly [character: string]: string } = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
}

/** Text as it stands inside an element or an attribute; what XML forbids becomes U+FFFD. */
export function escapeText(text: string): string {
  // Most texts hold nothing to escape, and looking is cheaper than replacing.
  if (/^[\u0020-\u0021\u0023-\u0025\u0028-\u003b\u003d\u003f-\u007e]*$/.test(text)) return text
  return text
    .replace(NOT_IN_XML, '\ufffd')
    .replace(/[&<>"']/g, (character) => ESCAPES[character] as string)
}

/** JSON as it stands inside an element: what XML forbids is written as JSON writes it, and reads back. */
export function escapeJson(json: string): string {
  const plain = json.replace(
    NOT_IN_XML,
    (character) => `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`,
  )
  return plain.replace(/[&<>]/g, (character) => ESCAPES[character] as string)
}
