import { useMemo, useState } from 'react'
import { drawingVerbs } from '../export'
import { Dialog } from '../shell/Dialog'
import { Menu } from '../shell/Menu'
import { Notice } from '../shell/Notice'
import { answerOf, usePage, usePageStore } from '../store'
import { PagePreview } from './PagePreview'
import { PaperChoice } from './PaperChoice'
import { type Choice, pagesOf } from './pages'
import { savePdf } from './save-pdf'
import { copyTable, saveTable, tables } from './save-table'
import { usePrinting } from './usePrinting'
import './report.css'

/** The report page by page, exactly as it will be printed, and the ways in which it leaves the page. */
export function ReportDialog({ onClose }: { readonly onClose: () => void }) {
  const store = usePageStore()
  const answer = usePage((state) => answerOf(state.history.sheet))
  const terminals = usePage((state) => state.pen.areTerminalsShown)
  const [choice, setChoice] = useState<Choice>({ kind: 'report', paper: {} })
  const pages = useMemo(() => pagesOf(answer, choice, terminals), [answer, choice, terminals])
  usePrinting(pages)

  return (
    <Dialog heading="Report, as it will be printed" onClose={onClose}>
      <div className="report">
        <div className="verbs">
          <button type="button" className="verb main" onClick={() => window.print()}>
            Print
          </button>
          <button type="button" className="verb" onClick={() => savePdf(store, choice)}>
            Save PDF
          </button>
          <Menu verb="Drawing alone" entries={drawingVerbs(store)} />
          <Menu
            verb="Tables"
            entries={tables.flatMap((name) => [
              { verb: `The ${name} as CSV`, onChoose: () => saveTable(store, name) },
              { verb: `The ${name} to the clipboard`, onChoose: () => copyTable(store, name) },
            ])}
          />
          <form method="dialog">
            <button type="submit" className="verb">
              Close
            </button>
          </form>
        </div>
        <Said />
        <PaperChoice choice={choice} onChoose={setChoice} />
        <Remarks pages={pages} isSettled={answer.whole !== undefined} />
        <div className="page-previews">
          {pages.map((page) => (
            <PagePreview key={page.number} page={page} />
          ))}
        </div>
      </div>
    </Dialog>
  )
}

/** How to print; once the page has something to say, that, where it can be read and heard. */
function Said() {
  const notice = usePage((state) => state.notice)
  const [before] = useState(notice)
  return (
    <div className="report-said">
      {notice === undefined || notice === before ? (
        <p>Print at 100 %, without scaling: the check line on each page then measures 100 mm.</p>
      ) : (
        <Notice />
      )}
    </div>
  )
}

/** What does not fit, of all pages, before anything is printed. */
function Remarks(properties: {
  readonly pages: ReturnType<typeof pagesOf>
  readonly isSettled: boolean
}) {
  const { pages, isSettled } = properties
  const remarks = pages.flatMap(({ number, remarks: each }) =>
    each.map((remark) => ({ number, remark })),
  )
  return (
    <div role="status" className="report-remarks">
      {!isSettled && (
        <p>
          Whether the readings agree is being worked out: it stands on the pages once it is known.
        </p>
      )}
      {remarks.length > 0 && (
        <ul className="fits-not" aria-label="What does not fit">
          {remarks.map(({ number, remark }) => (
            <li key={`${number} ${remark}`}>{`Sheet ${number}: ${remark}`}</li>
          ))}
        </ul>
      )}
      {isSettled && remarks.length === 0 && <p>Everything fits.</p>}
    </div>
  )
}
