import { useState } from 'react'
import { useKeep } from './context'
import { describeProblem } from './problem'
import { useSaveToFile } from './useSaveToFile'

/** What the user must know of the keeping of sheets: a sentence each, while it is so. */
export function KeepNotes() {
  const problem = useKeep((state) => state.problem)
  const isClockBack = useKeep((state) => state.isClockBack)
  const brokenCount = useKeep((state) => state.brokenCount)
  const save = useSaveToFile()
  return (
    <>
      {problem && (
        <div className="notice" data-tone="problem" role="alert" data-keep-problem={problem}>
          <p>{describeProblem(problem)}</p>
          <div className="verbs">
            <button type="button" className="verb" onClick={save}>
              Save to a file
            </button>
          </div>
        </div>
      )}
      {isClockBack && (
        <PassingNote text="The clock of this device stands before the time of changes that are already kept: the dates in My sheets may be wrong, their order is right." />
      )}
      {brokenCount > 0 && (
        <PassingNote
          text={`${brokenCount === 1 ? 'A kept sheet cannot be read and was' : `${brokenCount} kept sheets cannot be read and were`} left untouched: My sheets lists what there is, to be saved to a file.`}
        />
      )}
    </>
  )
}

/** A sentence that stays away once it was put away. */
function PassingNote({ text }: { readonly text: string }) {
  const [isAway, setAway] = useState(false)
  if (isAway) return null
  return (
    <div className="notice" data-tone="news" role="status">
      <p>{text}</p>
      <div className="verbs">
        <button type="button" className="verb" onClick={() => setAway(true)}>
          Put away
        </button>
      </div>
    </div>
  )
}
