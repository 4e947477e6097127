import { useState } from 'react'
import { parseAccuracy } from '../../core'
import type { Accuracy, Instrument } from '../../sheet'
import { Field } from '../details/Field'
import { usePageStore } from '../store'
import { maybeNumber, tryEdit } from './commit'

const UNITS: { readonly [of in Accuracy['of']]: string } = {
  voltage: 'V',
  current: 'A',
  power: 'W',
  angle: '°',
  time: 's',
  resistance: 'Ω',
}

const FUNCTIONS = Object.keys(UNITS) as Accuracy['of'][]

/** What the maker promises for each function and range, as the maker prints it. */
export function AccuracyList({ instrument }: { readonly instrument: Instrument }) {
  const { id, accuracy = [] } = instrument
  const store = usePageStore()
  const [of, setOf] = useState<Accuracy['of']>('voltage')
  const [range, setRange] = useState('')

  const change = (rows: readonly Accuracy[]) =>
    tryEdit(store, {
      kind: 'set-instrument',
      id,
      change: { accuracy: rows.length === 0 ? null : rows },
    })

  const add = (text: string): string | undefined => {
    if (text === '') return undefined
    const read = parseAccuracy(text, UNITS[of])
    if (!read.ok) return read.problem
    const end = maybeNumber(range, UNITS[of])
    if (!end.ok) return end.problem
    const row = { of, ...(end.value === null ? {} : { range: end.value }), text }
    if (accuracy.some((other) => other.of === of && other.range === row.range)) {
      return 'The accuracy of this range is stated already: take that out first.'
    }
    const problem = change([...accuracy, row])
    if (problem === undefined) setRange('')
    return problem
  }

  return (
    <>
      {accuracy.length > 0 && (
        <ul className="accuracy">
          {accuracy.map((row, index) => (
            <li key={`${row.of} ${row.range}`}>
              <span>{accuracyWords(row)}</span>
              <button
                type="button"
                className="verb"
                aria-label={`Take out ${accuracyWords(row)}`}
                onClick={() => change(accuracy.filter((_, at) => at !== index))}
              >
                Take out
              </button>
            </li>
          ))}
        </ul>
      )}
      <div className="fields">
        <label className="field">
          Accuracy of
          <select value={of} onChange={({ target }) => setOf(target.value as Accuracy['of'])}>
            {FUNCTIONS.map((each) => (
              <option key={each}>{each}</option>
            ))}
          </select>
        </label>
        <label className="field">
          {`On the range to, in ${UNITS[of]}`}
          <input
            value={range}
            placeholder="any"
            onChange={({ target }) => setRange(target.value)}
          />
        </label>
        <Field
          caption="As the maker prints it"
          value=""
          placeholder="±(0.7 % + 3 digits)"
          onCommit={add}
        />
      </div>
    </>
  )
}

function accuracyWords({ of, range, text }: Accuracy): string {
  return range === undefined ? `${of}: ${text}` : `${of} to ${range} ${UNITS[of]}: ${text}`
}
