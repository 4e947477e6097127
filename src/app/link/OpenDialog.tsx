import { useState } from 'react'
import { parseLink } from '../../sheet'
import { useKeeping } from '../keep'
import { Dialog } from '../shell/Dialog'
import { usePageStore } from '../store'
import { openFiles, openLink } from './open'

/** Opens a sheet from a pasted link, from whatever host it came, or from a saved file. */
export function OpenDialog({ onClose }: { readonly onClose: () => void }) {
  const store = usePageStore()
  const keeping = useKeeping()
  const [text, setText] = useState('')
  const [problem, setProblem] = useState<string>()

  const openText = () => {
    const result = parseLink(text)
    if (result.ok) {
      void openLink(store, keeping, text)
      onClose()
    } else {
      setProblem(result.errors[0]?.message ?? 'There is no sheet in this text.')
    }
  }

  return (
    <Dialog heading="Open a sheet" onClose={onClose}>
      <form
        className="stack"
        onSubmit={(event) => {
          event.preventDefault()
          openText()
        }}
      >
        <label htmlFor="link-to-open">
          Paste a link to a sheet. Only what stands after its # is read, and nothing is sent
          anywhere.
        </label>
        <textarea
          id="link-to-open"
          value={text}
          aria-invalid={problem !== undefined}
          aria-describedby={problem === undefined ? undefined : 'link-problem'}
          onChange={(event) => {
            setText(event.target.value)
            setProblem(undefined)
          }}
        />
        {problem !== undefined && (
          <p className="problem-text" id="link-problem" role="alert">
            {problem}
          </p>
        )}
        <div className="verbs">
          <button type="submit" className="verb main" disabled={text.trim() === ''}>
            Open the link
          </button>
          <label className="verb file">
            Choose a file
            <input
              type="file"
              multiple
              className="visually-hidden"
              accept=".svg,.json,.pdf,image/svg+xml,application/json,application/pdf"
              onChange={async (event) => {
                await openFiles(store, keeping, [...(event.target.files ?? [])])
                onClose()
              }}
            />
          </label>
          <button type="button" className="verb" onClick={onClose}>
            Cancel
          </button>
        </div>
        <p>
          A sheet saved to a file opens here again, and so do a drawing saved as SVG and a report
          saved as PDF, which carry their sheet: choose them, or drop them anywhere on the page.
        </p>
      </form>
    </Dialog>
  )
}
