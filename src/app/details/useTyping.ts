import { useState } from 'react'

/** The text of a field while it is typed; it is committed when the field is left. */
export interface Typing {
  readonly text: string
  /** Why what was typed is refused: the text stays. */
  readonly problem: string | undefined
  type(text: string): void
  commit(): void
  /** Goes back to what the sheet has. */
  drop(): void
}

/**
 * The text of a field that shows a value of the sheet.
 *
 * @param onCommit Takes the new text; returns why it cannot.
 */
export function useTyping(value: string, onCommit: (text: string) => string | undefined): Typing {
  const [text, setText] = useState<string>()
  const [problem, setProblem] = useState<string>()
  const drop = () => {
    setText(undefined)
    setProblem(undefined)
  }
  return {
    text: text ?? value,
    problem,
    type: (typed) => {
      setText(typed)
      setProblem(undefined)
    },
    commit: () => {
      if (text === undefined || text === value) return drop()
      const found = onCommit(text.trim())
      if (found === undefined) drop()
      else setProblem(found)
    },
    drop,
  }
}
