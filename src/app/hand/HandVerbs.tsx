import { checkedSum, hiddenSums, usePage, usePageStore } from '../store'

/** The verbs that put a pen into the hand, over the board. */
export function HandVerbs() {
  const store = usePageStore()
  const pen = usePage((state) => state.pen)
  const sheet = usePage((state) => state.history.sheet)
  const chosen = usePage((state) => state.chosenSum)
  const { setPen } = store.getState()
  const isHiding = hiddenSums(sheet, { ...pen, isExactShown: false }, chosen).size > 0
  const choose = (mode: 'hand' | 'phasor') =>
    setPen({
      mode: pen.mode === mode ? undefined : mode,
      isAdjusting: false,
      isExactShown: false,
    })

  return (
    <div
      className="hand-verbs over-board"
      role="toolbar"
      aria-label="Drawing; arrow keys nudge the picked arrow"
    >
      <button
        type="button"
        className="verb"
        aria-pressed={pen.mode === 'phasor'}
        onClick={() => choose('phasor')}
      >
        Draw phasor
      </button>
      <button
        type="button"
        className="verb"
        aria-pressed={pen.mode === 'hand'}
        disabled={checkedSum(sheet, chosen) === undefined}
        title="Construct the sum by hand, and see how good the construction is"
        onClick={() => choose('hand')}
      >
        Draw by hand
      </button>
      {pen.mode === 'hand' && (
        <button
          type="button"
          className="verb"
          aria-pressed={pen.isAdjusting}
          onClick={() => setPen({ isAdjusting: !pen.isAdjusting })}
        >
          Adjust
        </button>
      )}
      {isHiding && (
        <button
          type="button"
          className="verb"
          aria-pressed={pen.isExactShown}
          onClick={() => setPen({ isExactShown: !pen.isExactShown })}
        >
          Show calculated
        </button>
      )}
    </div>
  )
}
