import { useState } from 'react'
import { emptySheet } from '../../sheet'
import { MySheetsVerb, useSaveToFile } from '../keep'
import { linkTo, ShareMenu, warnedLength } from '../share'
import { usePageStore } from '../store'
import { CopyLinkDialog } from './CopyLinkDialog'
import { OpenDialog } from './OpenDialog'

/** New sheet, open, and copy link: the ways in and out that need no file. */
export function LinkVerbs() {
  const store = usePageStore()
  const save = useSaveToFile()
  const [opening, setOpening] = useState(false)
  const [refusedLink, setRefusedLink] = useState<string>()

  const copy = async () => {
    const { history, notify } = store.getState()
    const link = linkTo(history.sheet)
    try {
      await navigator.clipboard.writeText(link)
    } catch {
      setRefusedLink(link)
      return
    }
    const isLong = link.length > warnedLength
    const warning = isLong
      ? ` It has ${link.length} characters, and some mail programs cut links above ${warnedLength}: save the sheet to a file and send that instead.`
      : ''
    notify({
      tone: 'news',
      text: `Link copied. Whoever opens it sees this sheet.${warning}`,
      ...(isLong && { verbs: [{ verb: 'Save to a file', act: save }] }),
    })
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
      <ShareMenu />
      {opening && <OpenDialog onClose={() => setOpening(false)} />}
      {refusedLink !== undefined && (
        <CopyLinkDialog link={refusedLink} onClose={() => setRefusedLink(undefined)} />
      )}
    </>
  )
}
