import { jsPDF } from 'jspdf'
import { createPdf } from '../../../src/drawing/pdf'
import { reportPages } from '../../../src/drawing/report'
import { serializeSheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { fonts } from '../../drawing/pdf/fonts'
import { mixer } from '../../drawing/report/sheets'
import { type Measure, millisecondsOf, ratioOfMedians } from '../measure'

/** A character of every byte, as the library takes its typefaces. */
const binaries = Object.entries(fonts).map(
  ([name, bytes]) => [name, Buffer.from(bytes).toString('latin1')] as const,
)

/** So many empty pages with the same typefaces, made as the library makes them. */
function emptyPages(count: number): ArrayBuffer {
  const document = new jsPDF({ unit: 'mm', orientation: 'landscape', compress: true })
  for (const [name, binary] of binaries) {
    document.addFileToVFS(name, binary)
    document.addFont(name, name, 'normal', undefined, 'Identity-H')
  }
  for (let page = 1; page < count; page += 1) document.addPage()
  return document.output('arraybuffer')
}

export const reportAgainstEmptyPages: Measure = {
  name: 'a report of an ordinary job, pages and PDF : as many empty pages with its typefaces',
  goal: 2,
  measure: () => {
    const evaluation = evaluate(mixer)
    const sheetText = serializeSheet(mixer)
    const make = () => createPdf(reportPages(mixer, evaluation), { fonts, sheetText })
    const count = reportPages(mixer, evaluation).length
    return ratioOfMedians(
      {
        ours: () => millisecondsOf(make),
        theirs: () => millisecondsOf(() => emptyPages(count)),
      },
      25,
    )
  },
}
