import { Buffer } from 'node:buffer'
import { readFileSync } from 'node:fs'
import { deflateRawSync } from 'node:zlib'
import fc from 'fast-check'
import { deflateSync, strToU8 } from 'fflate'
import { expect, test } from 'vitest'
import { exampleSheet, parseLink, parseSheetText, type Sheet, serializeLink } from '../../src/sheet'
import { toBase64Url } from '../../src/sheet/link/base64url'
import { DICTIONARY_1 } from '../../src/sheet/link/dictionary-1'
import { seal } from '../../src/sheet/link/envelope'
import { anySheet } from './arbitrary-sheet'
import { unhurried } from './laws'
import { phasor, sheetOf } from './sheets'

const link = serializeLink(exampleSheet)
const opened = { ok: true, sheet: exampleSheet }

/** The sentence with which a text is refused as a link. */
function problemOf(text: string): string {
  const result = parseLink(text)
  if (result.ok) throw new Error('the link was opened')
  const [error] = result.errors
  expect(error?.message).toMatch(/^[A-Z].*[.]$/su)
  return error?.message ?? ''
}

/** A link that holds these bytes, sealed as if the program had made it. */
function forged(content: Uint8Array): string {
  return `#sheet=1.${toBase64Url(seal(content))}`
}

/** A link that holds this text where a packed sheet belongs. */
function holding(text: string): string {
  return forged(deflateSync(strToU8(text), { level: 9, dictionary: strToU8(DICTIONARY_1) }))
}

test('a link gives back the sheet that was sent, to the last sign', unhurried, () => {
  fc.assert(
    fc.property(anySheet, (sheet) => {
      const sent = serializeLink(sheet)
      expect(sent).toMatch(/^#sheet=1\.[A-Za-z0-9_-]+$/)
      const received = parseLink(`https://example.org/x/${sent}`)
      expect(received).toEqual({ ok: true, sheet })
      expect(received.ok && serializeLink(received.sheet)).toBe(sent)
    }),
  )
})

test('a link is found in any text, from any host', () => {
  const encoded = encodeURIComponent(link)
  for (const text of [
    link,
    link.slice(1),
    `  ${link}\n`,
    `https://example.org/${link}`,
    `http://10.0.0.7:8080/a/b/index.html?x=1${link}`,
    `file:///C:/tools/index.html${link}`,
    `<https://example.org/${link}>`,
    `"https://example.org/${link}".`,
    `See (https://example.org/${link}), please.`,
    `[sheet](https://example.org/${link})`,
    `_https://example.org/${link}_`,
    `Look: https://example.org/${link}?utm=1&x=2`,
    `https://mail.example/redirect?to=https%3A%2F%2Fexample.org%2F${encoded}&id=4`,
    `https://example.org/${encoded.toLowerCase().slice(0, 3)}${encoded.slice(3)}`,
  ]) {
    expect(parseLink(text), text.slice(0, 40)).toEqual(opened)
  }
})

test('a link that a mail program broke over lines is mended', () => {
  const broken = (between: string) => link.replace(/.{60}(?=.)/g, (part) => part + between)
  for (const between of ['\n', '\r\n', '=\r\n', '\n> ', '\n   ', '\u00ad', '\u200b', ' ']) {
    expect(parseLink(`see https://example.org/${broken(between)}\n\nRegards`)).toEqual(opened)
  }
})

test('a text without a link says where to find one', () => {
  for (const text of [
    '',
    'https://example.org/',
    'sheet',
    '#sheet',
    '#sheet.1=',
    '{"format":"x"}',
  ]) {
    expect(problemOf(text)).toContain('There is no sheet in this text')
  }
})

test('a link that is cut anywhere says so', () => {
  for (let length = link.indexOf('='); length < link.length; length += 1) {
    expect(problemOf(link.slice(0, length + 1).slice(0, length)), String(length)).toMatch(
      /cut short|no sheet/,
    )
  }
  expect(problemOf(link.slice(0, -1))).toContain('cut short')
  expect(problemOf('#sheet=1.')).toContain('cut short')
})

test('a link with any letter altered is not opened', () => {
  const start = link.indexOf('.') + 1
  for (let at = start; at < link.length; at += 1) {
    const other = link[at] === 'A' ? 'B' : 'A'
    const altered = link.slice(0, at) + other + link.slice(at + 1)
    expect(problemOf(altered), String(at)).toMatch(/altered|cut short/)
  }
})

test('a link of a newer version says so, one of no version too', () => {
  expect(problemOf(link.replace('=1.', '=2.'))).toContain('newer version')
  expect(problemOf(link.replace('=1.', '=999999.'))).toContain('newer version')
  expect(problemOf(link.replace('=1.', '=0.'))).toContain('no version')
})

test('a link that is too long is not read', () => {
  expect(problemOf(`#sheet=1.${'A'.repeat(65_537)}`)).toContain('too long')
  expect(problemOf(`#sheet=1.${'A'.repeat(10_000_000)}`)).toContain('too long')
})

test('a small link that would inflate to very much is stopped at 1 MB', () => {
  const zeros = deflateSync(new Uint8Array(40_000_000), { level: 9 })
  expect(zeros.length).toBeLessThan(49_000)
  expect(problemOf(forged(zeros))).toContain('too large')
  expect(problemOf(holding(`"${'x'.repeat(1_000_000)}"`))).toContain('too large')
  const stored = deflateSync(new Uint8Array(40_000), { level: 0 })
  expect(problemOf(forged(stored))).toContain('does not hold a sheet')
})

test('lists that would swell when they are unpacked do not', () => {
  const words = 'a|'.repeat(400_000)
  expect(parseLink(holding(`{"phasors":[1,"${words}"]}`)).ok).toBe(false)
  expect(
    parseLink(
      holding(`{"format":"phasogon-sheet","version":1,"title":"","phasors":[1,"id","${words}"]}`),
    ).ok,
  ).toBe(false)
  expect(problemOf(holding(`${'['.repeat(900_000)}`))).toContain('does not hold a sheet')
  expect(problemOf(holding(`${'[0,'.repeat(100_000)}0${']'.repeat(100_000)}`))).toContain(
    'does not hold a sheet',
  )
})

test('a link that holds something else says so, and one that holds a wrong sheet names the path', () => {
  for (const text of ['', 'x', '<svg/>', '[7,1]', '{"a":[9]}', '{"a":[1,"b|c"]}']) {
    expect(problemOf(holding(text)), text).toContain('does not hold a sheet')
  }
  expect(problemOf(forged(Uint8Array.of(7, 7, 7)))).toContain('does not hold a sheet')
  expect(parseLink(holding('null'))).toMatchObject({ ok: false, errors: [{ path: '' }] })
  const wrong = holding(
    '{"format":"phasogon-sheet","version":1,"title":"","phasors":[1,"id|label|quantity|magnitude","V1","V1","voltage",[1,"value",[2,"-3"]]]}',
  )
  expect(parseLink(wrong)).toMatchObject({
    ok: false,
    errors: [{ path: 'phasors[0].magnitude.value' }],
  })
  const infinite = holding(
    '{"format":"phasogon-sheet","version":1,"title":"","phasors":[0],"drift":1e400}',
  )
  expect(parseLink(infinite)).toMatchObject({ ok: false, errors: [{ path: 'drift' }] })
})

test('no text makes the reader of links throw', unhurried, () => {
  const body = fc.string({ unit: fc.constantFrom(...'ABCabc019-_%=.# \n>') })
  const mutated = fc.tuple(fc.nat(), fc.nat({ max: 9 }), body).map(([at, length, text]) => {
    const place = at % link.length
    return link.slice(0, place) + text + link.slice(place + length)
  })
  const anyText = fc.oneof(
    fc.string({ unit: 'binary' }),
    body.map((text) => `#sheet=1.${text}`),
    mutated,
    fc.uint8Array({ maxLength: 300 }).map(forged),
    fc.string().map(holding),
    fc.jsonValue().map((value) => holding(JSON.stringify(value))),
  )
  fc.assert(
    fc.property(anyText, (text) => {
      const result = parseLink(text)
      if (!result.ok) expect(result.errors[0]?.message).toMatch(/[.]$/)
    }),
    { numRuns: 2_000 },
  )
})

const saved = readFileSync(new URL('fixtures/twelve-phasors.json', import.meta.url), 'utf8')

function twelvePhasors(): Sheet {
  const parsed = parseSheetText(saved)
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors))
  return parsed.sheet
}

test('twelve phasors with readings and instruments make a link below 1,200 characters, at most 0.55 of plain deflate', () => {
  const characters = serializeLink(twelvePhasors()).length
  const json = JSON.stringify(JSON.parse(saved))
  const plain = [deflateRawSync(json, { level: 9 }), deflateSync(strToU8(json), { level: 9 })]
  expect(characters).toBeLessThan(1_200)
  for (const bytes of plain) {
    expect(characters / Buffer.from(bytes).toString('base64url').length).toBeLessThanOrEqual(0.55)
  }
})

test('links that were made with version 1 open for ever', () => {
  const file = new URL('fixtures/links-1.json', import.meta.url)
  const links: readonly { link: string; sheet: unknown }[] = JSON.parse(readFileSync(file, 'utf8'))
  expect(links.length).toBeGreaterThan(2)
  for (const { link: made, sheet } of links) {
    expect(parseLink(made)).toEqual({ ok: true, sheet })
  }
})

test('the largest sheet that a link can hold is told by its length', () => {
  const many = sheetOf({
    phasors: Array.from({ length: 2_000 }, (_, index) => phasor(`V${index}`)),
  })
  const long = serializeLink(many)
  expect(long.length).toBeLessThan(65_536)
  expect(parseLink(long)).toEqual({ ok: true, sheet: many })
})
