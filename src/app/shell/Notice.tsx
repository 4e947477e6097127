import { usePage, usePageStore } from '../store'

/** The one sentence that the page has for the user, with the verb that goes with it. */
export function Notice() {
  const notice = usePage((state) => state.notice)
  const store = usePageStore()
  if (!notice) return null
  const { undo, goBack, notify } = store.getState()
  return (
    <div
      className="notice"
      data-tone={notice.tone}
      role={notice.tone === 'problem' ? 'alert' : 'status'}
    >
      <p>{notice.text}</p>
      <div className="verbs">
        {notice.offer === 'undo' && (
          <button type="button" className="verb" onClick={undo}>
            Undo
          </button>
        )}
        {notice.offer === 'go-back' && (
          <button type="button" className="verb" onClick={goBack}>
            Go back
          </button>
        )}
        {notice.verbs?.map(({ verb, act }) => (
          <button key={verb} type="button" className="verb" onClick={act}>
            {verb}
          </button>
        ))}
        <button type="button" className="verb" onClick={() => notify(undefined)}>
          Put away
        </button>
      </div>
    </div>
  )
}
