import { zlibSync } from 'fflate'
import { describe, expect, test } from 'vitest'
import { exampleSheet, extractSheetFromPdf, isPdf, serializeSheet } from '../../src/sheet'

const text = serializeSheet({ ...exampleSheet, title: 'Ω ∠ 電圧' })
const content = Buffer.from(text, 'utf8')

/** A PDF of these objects, each a dictionary and what its stream holds. */
function pdfOf(...objects: readonly (readonly [string, Uint8Array])[]): Uint8Array {
  const parts = objects.flatMap(([dictionary, bytes], index) => [
    Buffer.from(`${index + 1} 0 obj\n<< ${dictionary} >>\nstream\n`, 'latin1'),
    bytes,
    Buffer.from('\nendstream\nendobj\n', 'latin1'),
  ])
  return new Uint8Array(
    Buffer.concat([Buffer.from('%PDF-1.4\n', 'latin1'), ...parts, Buffer.from('trailer\n%%EOF')]),
  )
}

describe('the sheet in a PDF', () => {
  test('is found as it is, and deflated', () => {
    const plain = pdfOf([`/Type /EmbeddedFile /Length ${content.length}`, content])
    expect(extractSheetFromPdf(plain)).toBe(text)
    const packed = zlibSync(content)
    const dictionary = `/Type /EmbeddedFile /Filter /FlateDecode /Length ${packed.length}`
    expect(extractSheetFromPdf(pdfOf([dictionary, packed]))).toBe(text)
    expect(
      extractSheetFromPdf(
        pdfOf([dictionary.replace(/\/Filter \/FlateDecode/, '/Filter [ /FlateDecode ]'), packed]),
      ),
    ).toBe(text)
  })

  test('is found among other streams, after another program wrote the PDF anew', () => {
    const packed = zlibSync(content)
    const pdf = pdfOf(
      ['/Length 3', Buffer.from('q Q')],
      ['/Filter /DCTDecode', Buffer.from([0xff, 0xd8, 0xff])],
      ['/Filter /FlateDecode /Length 99 0 R', packed],
    )
    expect(extractSheetFromPdf(pdf)).toBe(text)
  })

  test('is found though its bytes happen to spell the end of a stream', () => {
    const odd = serializeSheet({ ...exampleSheet, title: 'endstream endobj stream\n' })
    const bytes = Buffer.from(odd, 'utf8')
    expect(extractSheetFromPdf(pdfOf([`/Type /EmbeddedFile /Length ${bytes.length}`, bytes]))).toBe(
      odd,
    )
  })

  test('is not found where there is none', () => {
    expect(extractSheetFromPdf(new Uint8Array())).toBeUndefined()
    expect(extractSheetFromPdf(Buffer.from('no PDF at all'))).toBeUndefined()
    expect(extractSheetFromPdf(pdfOf(['/Length 3', Buffer.from('q Q')]))).toBeUndefined()
    expect(extractSheetFromPdf(content)).toBeUndefined()
  })

  test('a stream that is cut, spoiled or far too large is passed over', () => {
    const packed = zlibSync(content)
    const spoiled = packed.map((byte, at) => (at > 20 ? byte ^ 0x5a : byte))
    const bomb = zlibSync(new Uint8Array(20_000_000))
    for (const bytes of [spoiled, bomb, packed.subarray(0, 30)]) {
      const pdf = pdfOf(['/Type /EmbeddedFile /Filter /FlateDecode', bytes])
      expect(extractSheetFromPdf(pdf)).toBeUndefined()
    }
    const cut = pdfOf([`/Type /EmbeddedFile /Length ${content.length}`, content]).subarray(0, 300)
    expect(extractSheetFromPdf(cut)).toBeUndefined()
  })

  test('a PDF is told from other files', () => {
    expect(isPdf(pdfOf())).toBe(true)
    expect(isPdf(content)).toBe(false)
  })
})
