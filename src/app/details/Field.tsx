import { useId } from 'react'
import { FieldProblem } from './FieldProblem'
import { useTyping } from './useTyping'

/** A labelled field that commits when it is left; a refusal stands below it, and the text stays. */
export function Field(properties: {
  readonly caption: string
  readonly value: string
  readonly type?: 'text' | 'date'
  readonly placeholder?: string
  /** What may be meant, to be chosen instead of typed. */
  readonly offers?: readonly string[] | undefined
  /** Takes the new text; returns why it cannot. */
  readonly onCommit: (text: string) => string | undefined
}) {
  const { caption, value, type = 'text', placeholder, offers = [], onCommit } = properties
  const typing = useTyping(value, onCommit)
  const id = useId()
  return (
    <div className="field">
      <label htmlFor={id}>{caption}</label>
      <input
        id={id}
        type={type}
        value={typing.text}
        placeholder={placeholder}
        list={offers.length === 0 ? undefined : `${id}-offers`}
        aria-invalid={typing.problem !== undefined}
        aria-describedby={typing.problem === undefined ? undefined : `${id}-problem`}
        onChange={({ target }) => typing.type(target.value)}
        onBlur={typing.commit}
        onKeyDown={(event) => {
          if (event.key === 'Enter') typing.commit()
          if (event.key === 'Escape') typing.drop()
        }}
      />
      {offers.length > 0 && (
        <datalist id={`${id}-offers`}>
          {offers.map((offer) => (
            <option key={offer} value={offer} />
          ))}
        </datalist>
      )}
      <FieldProblem id={`${id}-problem`} problem={typing.problem} />
    </div>
  )
}
