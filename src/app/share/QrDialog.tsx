import { useEffect, useState } from 'react'
import { useSaveToFile } from '../keep'
import { Dialog } from '../shell/Dialog'
import { paintQrCode } from './paint-qr'
import type { QrCode } from './qr-code'

/** The link as a QR code, to be scanned from the screen; where it is too long, what to do instead. */
export function QrDialog(properties: { readonly link: string; readonly onClose: () => void }) {
  const { link, onClose } = properties
  const code = useQrCode(link)
  const save = useSaveToFile()
  const room = Math.min(window.innerWidth - 64, window.innerHeight - 180)
  return (
    <Dialog heading="QR code of the link" onClose={onClose}>
      <form method="dialog" className="stack">
        {code === 'none' ? (
          <p>
            {`The link has ${link.length} characters, more than a QR code holds that a camera can read from a screen. Save the sheet to a file and pass that on.`}
          </p>
        ) : (
          <>
            <p>Scan it with another device: the code holds the whole sheet, and nothing is sent.</p>
            {code !== undefined && (
              <canvas
                className="qr-code"
                role="img"
                aria-label="QR code of the link to this sheet"
                ref={(canvas) => {
                  if (canvas) paintQrCode(canvas, code, room)
                }}
              />
            )}
          </>
        )}
        <div className="verbs">
          <button type="submit" className="verb main">
            Done
          </button>
          {code === 'none' && (
            <button type="submit" className="verb" onClick={save}>
              Save to a file
            </button>
          )}
        </div>
      </form>
    </Dialog>
  )
}

/** The code of a link; `none` where it fits none; undefined until it is there. */
function useQrCode(link: string): QrCode | 'none' | undefined {
  const [code, setCode] = useState<QrCode | 'none'>()
  useEffect(() => {
    let isWanted = true
    void import('./qr-code').then(({ maybeQrCode }) => {
      if (isWanted) setCode(maybeQrCode(link) ?? 'none')
    })
    return () => {
      isWanted = false
    }
  }, [link])
  return code
}
