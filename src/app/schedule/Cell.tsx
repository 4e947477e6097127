import {
  type KeyboardEvent,
  type MouseEvent,
  useId,
  useLayoutEffect,
  useRef,
  useState,
} from 'react'

/** What a cell needs: what it shows at rest, what is edited, and what to do with the new text. */
export interface CellProperties {
  /** The accessible name, such as "Magnitude of VR". */
  readonly name: string
  readonly column: string
  /** At rest: digits and unit as they are printed. */
  readonly shown: string
  /** While it is edited: the text as it was typed. */
  readonly typed: string
  /** Where the value was worked out or assumed, not typed. */
  readonly derived?: boolean
  readonly readOnly?: boolean
  readonly placeholder?: string
  /** Takes the new text; returns why it cannot, in one plain sentence. */
  readonly onCommit: (text: string) => string | undefined
}

/** What is being typed, and what stood there when the cell was entered. */
interface Entry {
  readonly text: string
  readonly opened: string
}

/**
 * One cell of a table. What it cannot read stays in the cell, with a sentence below that says why;
 * the sheet keeps the old value. Enter goes down the column, Escape brings the old value back.
 */
export function Cell(properties: CellProperties) {
  const { name, column, shown, typed, derived, readOnly, placeholder, onCommit } = properties
  const [entry, setEntry] = useState<Entry>()
  const [problem, setProblem] = useState<string>()
  const input = useRef<HTMLInputElement>(null)
  const entering = useRef(false)
  const problemId = useId()

  // At once, before the next key: a selection that came later would swallow what was typed by then.
  useLayoutEffect(() => {
    if (!entering.current || entry === undefined) return
    entering.current = false
    input.current?.select()
  }, [entry])

  const changed = entry !== undefined && entry.text !== entry.opened
  if (entry && !changed && entry.opened !== typed) setEntry({ text: typed, opened: typed })

  // Enter commits and then leaves the cell, which commits too, before the cell is rendered anew.
  const open = useRef(entry)
  open.current = entry

  const close = () => {
    open.current = undefined
    setEntry(undefined)
    setProblem(undefined)
  }

  const commit = (): boolean => {
    if (!open.current || open.current.text === open.current.opened) {
      close()
      return true
    }
    const found = onCommit(open.current.text.trim())
    if (found === undefined) close()
    else setProblem(found)
    return found === undefined
  }

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') {
      event.preventDefault()
      if (commit()) focusBelow(event.currentTarget, event.shiftKey ? -1 : 1)
    } else if (event.key === 'Escape') {
      close()
    } else if (event.altKey || event.ctrlKey || event.metaKey) {
      return
    } else if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault()
      if (commit()) focusBelow(event.currentTarget, event.key === 'ArrowUp' ? -1 : 1)
    }
  }

  return (
    <div className="cell" data-derived={derived || undefined}>
      <input
        ref={input}
        aria-label={name}
        aria-invalid={problem !== undefined}
        aria-describedby={problem === undefined ? undefined : problemId}
        data-column={column}
        value={entry?.text ?? shown}
        data-changed={changed || undefined}
        placeholder={placeholder}
        readOnly={readOnly}
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        onFocus={() => {
          if (readOnly || entry !== undefined) return
          entering.current = true
          setEntry({ text: typed, opened: typed })
        }}
        onMouseDown={focusWhole}
        onChange={(event) => {
          setEntry({ text: event.target.value, opened: entry?.opened ?? typed })
          setProblem(undefined)
        }}
        onBlur={commit}
        onKeyDown={onKeyDown}
      />
      {problem !== undefined && (
        <p className="cell-problem" id={problemId} role="alert">
          {problem}
        </p>
      )}
    </div>
  )
}

/** Enters a cell by a click without putting the caret into it, so that the whole text stays selected. */
function focusWhole(event: MouseEvent<HTMLInputElement>): void {
  if (document.activeElement === event.currentTarget) return
  event.preventDefault()
  event.currentTarget.focus()
}

/** Moves the focus to the same column of the next row, or of the one before. */
function focusBelow(input: HTMLInputElement, step: 1 | -1): void {
  const row = input.closest('[data-row]')
  const next = step === 1 ? row?.nextElementSibling : row?.previousElementSibling
  const target = next?.querySelector<HTMLInputElement>(`[data-column="${input.dataset.column}"]`)
  if (target) target.focus()
  else input.blur()
}
