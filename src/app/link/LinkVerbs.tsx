import { useState } from 'react'
import { emptySheet, serializeLink } from '../../sheet'
import { MySheetsVerb } from '../keep'
import { usePageStore } from '../store'
import { CopyLinkDialog } from './CopyLinkDialog'
import { OpenDialog } from './OpenDialog'

const warnedLength = 2_000

/** New sheet, open, and copy link: the ways in and out that need no file. */
export function LinkVerbs() {
  const store = usePageStore()
  const [opening, setOpening] = useState(false)
  const [refusedLink, setRefusedLink] = useState<string>()

  const copy = async () => {
    const { history, notify } = store.getState()
    const link = new URL(serializeLink(history.sheet), window.location.href).href
    try {
      await navigator.clipboard.writeText(link)
    } catch {
      setRefusedLink(link)
      return
    }
    const long =
      link.length > warnedLength
        ? ` It has ${link.length} characters, and some mail programs cut links above ${warnedLength}: send the saved drawing instead, which carries the sheet too.`
        : ''
    notify({ tone: 'news', text: `Link copied. Whoever opens it sees this sheet.${long}` })
  }

  return (
    <>
      <button
        type="button"
        className="verb"
        onClick={() => store.getState().open(emptySheet(), 'new', 'New sheet.')}
      >
        New sheet
      </button>
      <MySheetsVerb />
      <button type="button" className="verb" onClick={() => setOpening(true)}>
        Open
      </button>
      <button type="button" className="verb" onClick={copy}>
        Copy link
      </button>
      {opening && <OpenDialog onClose={() => setOpening(false)} />}
      {refusedLink !== undefined && (
        <CopyLinkDialog link={refusedLink} onClose={() => setRefusedLink(undefined)} />
      )}
    </>
  )
}
