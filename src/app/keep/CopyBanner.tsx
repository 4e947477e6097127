import { usePage, usePageStore } from '../store'
import { concludedOf, describeOwner } from './concluded'

/** Says that the open sheet is a copy, of what, and what was concluded on it. */
export function CopyBanner() {
  const store = usePageStore()
  const identity = usePage((state) => state.identity)
  const sheet = usePage((state) => state.history.sheet)
  const isAsItCame = usePage((state) => state.origin === 'link' && state.history.past.length === 0)
  // What was concluded grows when the whole answer comes.
  usePage((state) => state.answer)
  const { copy } = identity
  if (copy === undefined) return null
  const makeMine = () => {
    store.getState().identify(identity.id, { id: identity.id })
    store
      .getState()
      .notify({ tone: 'news', text: 'This sheet is yours now, and kept in My sheets.' })
  }
  return (
    <section className="copy-banner" aria-label="Copy">
      <p>{describeCopy(copy.why, describeOwner(copy.of, sheet), isAsItCame)}</p>
      {isAsItCame && (
        <ul aria-label="What was concluded">
          {concludedOf(sheet).map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      )}
      <div className="verbs">
        <button type="button" className="verb" onClick={makeMine}>
          Make it mine
        </button>
      </div>
    </section>
  )
}

function describeCopy(why: 'link' | 'tabs', owner: string, isAsItCame: boolean): string {
  if (why === 'tabs') return `A copy of ${owner}, made when two tabs changed it at once.`
  return isAsItCame
    ? `${owner}, as it came by a link. What was concluded stands here first; check it in the rows and on the drawing below. Nothing of yours was replaced.`
    : `Your copy of ${owner}, which came by a link.`
}
