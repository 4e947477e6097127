import { useId, useState } from 'react'

/** A labelled field that commits when it is left; a refusal stands below it, and the text stays. */
export function Field(properties: {
  readonly caption: string
  readonly value: string
  readonly type?: 'text' | 'date'
  readonly placeholder?: string
  /** Takes the new text; returns why it cannot. */
  readonly onCommit: (text: string) => string | undefined
}) {
  const { caption, value, type = 'text', placeholder, onCommit } = properties
  const [text, setText] = useState<string>()
  const [problem, setProblem] = useState<string>()
  const id = useId()

  const close = () => {
    setText(undefined)
    setProblem(undefined)
  }
  const commit = () => {
    if (text === undefined || text === value) return close()
    const found = onCommit(text.trim())
    if (found === undefined) close()
    else setProblem(found)
  }

  return (
    <div className="field">
      <label htmlFor={id}>{caption}</label>
      <input
        id={id}
        type={type}
        value={text ?? value}
        placeholder={placeholder}
        aria-invalid={problem !== undefined}
        aria-describedby={problem === undefined ? undefined : `${id}-problem`}
        onChange={(event) => {
          setText(event.target.value)
          setProblem(undefined)
        }}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === 'Enter') commit()
          if (event.key === 'Escape') close()
        }}
      />
      {problem !== undefined && (
        <p className="cell-problem" id={`${id}-problem`} role="alert">
          {problem}
        </p>
      )}
    </div>
  )
}
