import { useState } from 'react'
import { useSaveToFile } from '../keep'
import { Menu } from '../shell/Menu'
import { usePageStore } from '../store'
import { QrDialog } from './QrDialog'
import { canShare, linkTo, shareSheet } from './system-share'

/** The ways in which the whole sheet leaves the page, beside the copied link. */
export function ShareMenu() {
  const store = usePageStore()
  const save = useSaveToFile()
  const [link, setLink] = useState<string>()

  const share = async () => {
    const { history, notify } = store.getState()
    const problem = await shareSheet(history.sheet)
    if (problem !== undefined) notify({ tone: 'problem', text: problem })
  }

  return (
    <>
      <Menu
        verb="Share"
        entries={[
          { verb: 'Save to a file', onChoose: save },
          {
            verb: 'QR code of the link',
            onChoose: () => setLink(linkTo(store.getState().history.sheet)),
          },
          ...(canShare() ? [{ verb: 'Share with …', onChoose: () => void share() }] : []),
        ]}
      />
      {link !== undefined && <QrDialog link={link} onClose={() => setLink(undefined)} />}
    </>
  )
}
