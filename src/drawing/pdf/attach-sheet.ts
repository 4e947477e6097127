import type { jsPDF } from 'jspdf'

/** The parts of the library by which other objects are written into a document. */
interface Writer {
  newObject(): number
  out(text: string): void
  putStream(options: {
    data: string
    objectId: number
    additionalKeyValues: { key: string; value: string | number }[]
  }): void
  readonly events: { subscribe(topic: string, callback: () => void): string }
}

/** What an attached sheet is called. */
export const ATTACHMENT = 'sheet.phasogon.json'

/**
 * Attaches the sheet to a document as a file, which any reader can save and `extractSheetFromPdf` finds
 * again (ISO 32000-1, 7.11.4).
 *
 * @param sheetText The sheet as JSON.
 */
export function attachSheet(document: jsPDF, sheetText: string): void {
  const writer = document.internal as typeof document.internal & Writer
  const bytes = toUtf8(sheetText)
  let specification = 0
  writer.events.subscribe('postPutResources', () => {
    const file = writer.newObject()
    writer.putStream({
      data: bytes,
      objectId: file,
      additionalKeyValues: [
        { key: 'Type', value: '/EmbeddedFile' },
        { key: 'Subtype', value: '/application#2Fjson' },
        { key: 'Params', value: `<< /Size ${bytes.length} >>` },
      ],
    })
    writer.out('endobj')
    specification = writer.newObject()
    writer.out(
      `<< /Type /Filespec /F (${ATTACHMENT}) /UF (${ATTACHMENT}) /AFRelationship /Source` +
        ` /Desc (The sheet that this was printed from) /EF << /F ${file} 0 R /UF ${file} 0 R >> >>`,
    )
    writer.out('endobj')
  })
  writer.events.subscribe('putCatalog', () => {
    writer.out(`/Names << /EmbeddedFiles << /Names [(${ATTACHMENT}) ${specification} 0 R] >> >>`)
    writer.out(`/AF [${specification} 0 R]`)
  })
}

/** The bytes of UTF-8 as the library takes them: a character each. */
function toUtf8(text: string): string {
  return encodeURIComponent(text).replace(/%([0-9A-F]{2})/g, (_, hexadecimal: string) =>
    String.fromCharCode(Number.parseInt(hexadecimal, 16)),
  )
}
