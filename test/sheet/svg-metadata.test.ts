import fc from 'fast-check'
import { expect, test } from 'vitest'
import { extractSheetText, parseSheetText, serializeSheet } from '../../src/sheet'
import { anySheet } from './arbitrary-sheet'
import { unhurried } from './laws'

const escaped = (text: string) =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;')
const numbered = (text: string) => text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)
const hexadecimal = (text: string) =>
  text.replace(/[&<>"']/g, (sign) => `&#x${sign.charCodeAt(0).toString(16)};`)
const inSection = (text: string) => `<![CDATA[${text.replaceAll(']]>', ']]]]><![CDATA[>')}]]>`

/** The ways in which a program may write a text into markup. */
const WAYS = [escaped, numbered, hexadecimal, inSection]

test(
  'a drawing gives back the sheet in its metadata, however its signs are written',
  unhurried,
  () => {
    fc.assert(
      fc.property(anySheet, fc.constantFrom(...WAYS), (sheet, write) => {
        const svg = `<svg><title>x</title><metadata>${write(serializeSheet(sheet))}</metadata><g/></svg>`
        const found = extractSheetText(svg)
        expect(found === undefined ? found : parseSheetText(found)).toEqual({ ok: true, sheet })
      }),
    )
  },
)

test('other metadata before it, an element around it and comments in it do not matter', () => {
  const sheet = '{"format":"phasogon-sheet","a":"&lt;b&gt; &amp;amp;"}'
  const svg = `<svg>
    <metadata id="m1"><rdf:RDF><cc:Work rdf:about="{}"/></rdf:RDF></metadata>
    <metadata id="m2" >
      <!-- a } comment { --><p:sheet xmlns:p="urn:x">${sheet}</p:sheet>
    </metadata></svg>`
  expect(extractSheetText(svg)).toBe('{"format":"phasogon-sheet","a":"<b> &amp;"}')
})

test('a drawing without a sheet, or cut short, gives none', () => {
  for (const svg of [
    '',
    '<svg/>',
    '<svg><metadata/></svg>',
    '<svg><metadata>{"a":1}</metadata></svg>',
    '<svg><metadata>phasogon-sheet</metadata></svg>',
    '<svg><metadata>{"format":"phasogon-sheet"',
    '<svg><metadata',
    '<metadata></metadata',
  ]) {
    expect(extractSheetText(svg)).toBeUndefined()
  }
})

test('any text at all is searched without a complaint', unhurried, () => {
  const pieces = fc.constantFrom(
    '<metadata',
    '>',
    '</metadata>',
    '<![CDATA[',
    ']]>',
    '<!--',
    '{"format":"phasogon-sheet"}',
    '&#x110000;',
    '&#99999999;',
    '&lt;',
    '&toString;',
    '<',
  )
  fc.assert(
    fc.property(fc.array(fc.oneof(pieces, fc.string())), (texts) => {
      const found = extractSheetText(texts.join(''))
      expect(found === undefined || found.startsWith('{')).toBe(true)
    }),
  )
})
