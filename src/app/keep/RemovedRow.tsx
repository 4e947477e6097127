/** A sheet that was deleted while the list is shown: the way back. */
export function RemovedRow(properties: { readonly title: string; readonly onPutBack: () => void }) {
  const { title, onPutBack } = properties
  return (
    <li className="sheet-row removed">
      <p>{`“${title}” is deleted. It can be put back while this list is open.`}</p>
      <button type="button" className="verb" aria-label={`Put back ${title}`} onClick={onPutBack}>
        Put back
      </button>
    </li>
  )
}
