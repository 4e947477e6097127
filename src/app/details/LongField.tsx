import { useId } from 'react'
import { FieldProblem } from './FieldProblem'
import { useTyping } from './useTyping'

/** A labelled field for several lines, which commits when it is left. */
export function LongField(properties: {
  readonly caption: string
  readonly value: string
  readonly placeholder?: string
  /** Takes the new text; returns why it cannot. */
  readonly onCommit: (text: string) => string | undefined
}) {
  const { caption, value, placeholder, onCommit } = properties
  const typing = useTyping(value, onCommit)
  const id = useId()
  return (
    <div className="field long">
      <label htmlFor={id}>{caption}</label>
      <textarea
        id={id}
        rows={3}
        value={typing.text}
        placeholder={placeholder}
        aria-invalid={typing.problem !== undefined}
        aria-describedby={typing.problem === undefined ? undefined : `${id}-problem`}
        onChange={({ target }) => typing.type(target.value)}
        onBlur={typing.commit}
        onKeyDown={({ key }) => {
          if (key === 'Escape') typing.drop()
        }}
      />
      <FieldProblem id={`${id}-problem`} problem={typing.problem} />
    </div>
  )
}
