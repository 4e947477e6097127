import { formatLimit } from '../../core'
import {
  type Id,
  labelOf,
  limitOf,
  type Reading,
  type Remark,
  readingText,
  referenceOf,
  type Sheet,
  wordsOf,
} from '../../sheet'
import { Cell } from '../schedule/Cell'
import { usePageStore } from '../store'
import { changeReading, commitFigures, commitReadingLimit, unitOfReading } from './commit'
import { KINDS, otherField } from './kinds'
import { PhasorSelect } from './PhasorSelect'
import { ReadingDetails } from './ReadingDetails'

/** One reading: as it was shown, and below it what it comes to and what is odd about it. */
export function ReadingRow(properties: {
  readonly sheet: Sheet
  readonly reading: Reading
  readonly number: number
  readonly remarks: readonly Remark[]
}) {
  const { sheet, reading, number, remarks } = properties
  const store = usePageStore()
  const name = `reading ${number}`
  const text = readingText(reading)
  const words = reading.struck ? 'Struck out: kept, and not used.' : wordsOf(sheet, reading)

  return (
    <li
      className="reading"
      data-row={reading.id}
      data-struck={reading.struck || undefined}
      onFocus={() => store.getState().select({ kind: 'phasor', id: reading.of })}
    >
      <div className="reading-cells">
        <PhasorSelect
          sheet={sheet}
          name={`Phasor of ${name}`}
          value={reading.of}
          onChoose={(of) =>
            of !== undefined && report(store, changeReading(store, reading, { of }))
          }
        />
        <span className="reading-kind">{KINDS[reading.kind].name}</span>
        <Cell
          name={`Shown by ${name}, ${labelOf(sheet, reading.of)}`}
          column="shown"
          shown={text}
          typed={text}
          placeholder={KINDS[reading.kind].example}
          onCommit={(entered) => commitFigures(store, sheet, reading, entered)}
        />
        <OtherSelect sheet={sheet} reading={reading} name={name} />
        <LimitCell sheet={sheet} reading={reading} name={name} />
      </div>
      <p className="reading-words">{words}</p>
      {remarks.map((remark) => (
        <p key={remark.text} className="reading-remark">
          {remark.text}
        </p>
      ))}
      <ReadingDetails sheet={sheet} reading={reading} number={number} />
    </li>
  )
}

/** Says a refusal where no cell can say it below itself. */
function report(store: ReturnType<typeof usePageStore>, problem: string | undefined): void {
  if (problem !== undefined) store.getState().notify({ tone: 'problem', text: problem })
}

function OtherSelect(properties: {
  readonly sheet: Sheet
  readonly reading: Reading
  readonly name: string
}) {
  const { sheet, reading, name } = properties
  const store = usePageStore()
  const field = otherField(reading.kind)
  if (field === undefined) return <span />
  const value: Id | undefined =
    'with' in reading ? reading.with : 'against' in reading ? reading.against : undefined
  const reference = referenceOf(sheet)
  return (
    <PhasorSelect
      sheet={sheet}
      name={`${field === 'with' ? 'Current' : 'Measured against'} of ${name}`}
      value={value}
      without={reading.of}
      {...(field === 'against' && reference !== undefined
        ? { none: `against ${labelOf(sheet, reference)}` }
        : {})}
      onChoose={(id) => report(store, changeReading(store, reading, { [field]: id ?? null }))}
    />
  )
}

function LimitCell(properties: {
  readonly sheet: Sheet
  readonly reading: Reading
  readonly name: string
}) {
  const { sheet, reading, name } = properties
  const store = usePageStore()
  const { limit } = reading
  const text =
    limit === undefined ? '' : formatLimit(limit, unitOfReading(sheet, reading)).replace('± ', '')
  const from = limitOf(sheet, reading)?.from
  return (
    <Cell
      name={`Limit of ${name}`}
      column="limit"
      shown={text}
      typed={text}
      placeholder={from === 'instrument' ? 'accuracy' : 'assumed'}
      onCommit={(entered) => commitReadingLimit(store, sheet, reading, entered)}
    />
  )
}
