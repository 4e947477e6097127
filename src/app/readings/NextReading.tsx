import { type KeyboardEvent, useId, useState } from 'react'
import {
  createReading,
  type Id,
  labelOf,
  type NextReading as Next,
  newId,
  parseReadingText,
  type Reading,
  referenceOf,
  type Sheet,
} from '../../sheet'
import { usePageStore } from '../store'
import { quantityOf, tryEdit } from './commit'
import { KIND_LIST, KINDS, otherField } from './kinds'
import { PhasorSelect } from './PhasorSelect'

/** What was picked by hand for the next reading; what is left out follows from the last. */
interface Picked {
  readonly of?: Id
  readonly kind?: Reading['kind']
  readonly other?: Id
}

/**
 * The row in which the next reading is typed. It stands ready for the phasor and kind that are likely to
 * come next, taken as the last one was: type what the display shows, press Enter, and go on.
 */
export function NextReading({ sheet, next }: { readonly sheet: Sheet; readonly next: Next }) {
  const store = usePageStore()
  const [picked, setPicked] = useState<Picked>({})
  const [text, setText] = useState('')
  const [problem, setProblem] = useState<string>()
  const id = useId()

  const of = sheet.phasors.find((phasor) => phasor.id === picked.of)?.id ?? next.of
  const kind = picked.kind ?? next.kind
  const field = otherField(kind)
  const other =
    picked.other ?? (field === 'with' ? (next.with ?? currentOf(sheet, of)) : next.against)

  const add = (): boolean => {
    const parsed = parseReadingText(kind, text, quantityOf(sheet, of))
    if (!parsed.ok) return refuse(parsed.problem)
    const subject = {
      id: newId(sheet, 'r1'),
      of,
      kind,
      ...(field === undefined || other === undefined || other === of ? {} : { [field]: other }),
    }
    const taken = kind === next.kind ? next.taken : {}
    const found = tryEdit(store, {
      kind: 'add-reading',
      reading: createReading(subject, parsed.value, taken),
    })
    if (found !== undefined) return refuse(found)
    setText('')
    setProblem(undefined)
    setPicked({})
    return true
  }

  const refuse = (sentence: string): false => {
    setProblem(sentence)
    return false
  }

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') {
      event.preventDefault()
      if (text.trim() !== '') add()
    } else if (event.key === 'Escape') {
      setText('')
      setProblem(undefined)
    } else if (event.key === 'ArrowUp' && text === '') {
      event.preventDefault()
      const above = event.currentTarget.closest('[data-row]')?.previousElementSibling
      above?.querySelector<HTMLInputElement>('[data-column="shown"]')?.focus()
    }
  }

  return (
    <li className="reading next" data-row="next">
      <div className="reading-cells">
        <PhasorSelect
          sheet={sheet}
          name="Phasor of the next reading"
          value={of}
          onChoose={(chosen) => setPicked({ ...picked, ...(chosen && { of: chosen }) })}
        />
        <select
          aria-label="Kind of the next reading"
          value={kind}
          onChange={({ target }) => setPicked({ ...picked, kind: target.value as Reading['kind'] })}
        >
          {KIND_LIST.map((each) => (
            <option key={each} value={each}>
              {KINDS[each].name}
            </option>
          ))}
        </select>
        <div className="cell">
          <input
            aria-label={`What the display shows of ${labelOf(sheet, of)}, ${KINDS[kind].name}`}
            aria-invalid={problem !== undefined}
            aria-describedby={problem === undefined ? undefined : id}
            data-column="shown"
            data-changed={text === '' ? undefined : true}
            value={text}
            placeholder={KINDS[kind].example}
            autoComplete="off"
            autoCapitalize="off"
            spellCheck={false}
            onChange={({ target }) => {
              setText(target.value)
              setProblem(undefined)
            }}
            onKeyDown={onKeyDown}
          />
          {problem !== undefined && (
            <p className="cell-problem" id={id} role="alert">
              {problem}
            </p>
          )}
        </div>
        {field !== undefined && (
          <PhasorSelect
            sheet={sheet}
            name={field === 'with' ? 'Current of the next reading' : 'The next reading is against'}
            value={other}
            without={of}
            {...(field === 'against' && {
              none: `against ${labelOf(sheet, referenceOf(sheet) ?? of)}`,
            })}
            onChoose={(chosen) => {
              const { other: _, ...rest } = picked
              setPicked(chosen === undefined ? rest : { ...rest, other: chosen })
            }}
          />
        )}
        <button
          type="button"
          className="verb"
          aria-label="Add reading"
          disabled={text.trim() === ''}
          onClick={add}
        >
          Add
        </button>
      </div>
      <p className="reading-words">{asBefore(sheet, next, kind)}</p>
    </li>
  )
}

/** The current that a power is most likely of. */
function currentOf(sheet: Sheet, of: Id): Id | undefined {
  return (
    sheet.phasors.find(({ id, quantity }) => quantity === 'current' && id !== of) ??
    sheet.phasors.find(({ id }) => id !== of)
  )?.id
}

/** How the next reading is taken if nothing else is said, in words. */
function asBefore(sheet: Sheet, { kind, taken }: Next, chosen: Reading['kind']): string {
  const { instrument, range, channel, pass } = taken
  if (kind !== chosen || Object.keys(taken).length === 0) return ''
  const name = sheet.instruments?.find(({ id }) => id === instrument)?.name
  const through = sheet.channels?.find(({ id }) => id === channel)
  return [
    'As the last one:',
    ...(name === undefined ? [] : [name]),
    ...(range ? [`range ${range}`] : []),
    ...(through === undefined ? [] : [`through ${through.label ?? through.id}`]),
    ...(pass ? [`pass ${pass}`] : []),
  ].join(' ')
}
