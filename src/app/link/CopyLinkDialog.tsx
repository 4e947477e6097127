import { Dialog } from '../shell/Dialog'

/** The link to be copied by hand, where the browser does not let the page write to the clipboard. */
export function CopyLinkDialog({
  link,
  onClose,
}: {
  readonly link: string
  readonly onClose: () => void
}) {
  return (
    <Dialog heading="Copy this link" onClose={onClose}>
      <form method="dialog" className="stack">
        <p>
          The browser does not let the page use the clipboard. The link is selected: copy it from
          here.
        </p>
        <textarea
          aria-label="Link to this sheet"
          readOnly
          value={link}
          ref={(field) => field?.select()}
        />
        <div className="verbs">
          <button type="submit" className="verb main">
            Done
          </button>
        </div>
      </form>
    </Dialog>
  )
}
