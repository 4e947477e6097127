import { type ClipboardEvent, useMemo, useState } from 'react'
import { nextReading, type Remark, readingTable, remarksOn, type Sheet } from '../../sheet'
import { answerOf, usePage, usePageStore } from '../store'
import { Angles } from './Angles'
import { AssumedLimits } from './AssumedLimits'
import { Channels } from './Channels'
import { Conversions } from './Conversions'
import { copyReadings } from './copy'
import { Instruments } from './Instruments'
import { NextReading } from './NextReading'
import { PasteReadings } from './PasteReadings'
import { ReadingRow } from './ReadingRow'
import './readings.css'

/** What the meters showed: one row for each indication, and with what it was taken. */
export function Readings() {
  const store = usePageStore()
  // The committed sheet: a drag changes no reading, and is not to wait for their words in each frame.
  const sheet = usePage((state) => state.history.sheet)
  const { evaluation } = answerOf(sheet)
  const [pasted, setPasted] = useState<string>()
  const remarks = useMemo(() => remarksByPart(sheet), [sheet])
  const next = useMemo(() => nextReading(sheet), [sheet])
  const readings = sheet.readings ?? []

  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain')
    if (!/[\t\n]/.test(text.trim())) return
    event.preventDefault()
    setPasted(text)
  }

  return (
    <section aria-labelledby="readings-heading" onPaste={onPaste}>
      <h2 id="readings-heading">Readings</h2>
      <ol className="readings">
        {readings.map((reading, index) => (
          <ReadingRow
            key={reading.id}
            sheet={sheet}
            reading={reading}
            number={index + 1}
            remarks={remarks.get(reading.id) ?? NONE}
          />
        ))}
        {next && <NextReading sheet={sheet} next={next} />}
      </ol>
      <div className="verbs">
        <button type="button" className="verb" onClick={() => setPasted('')}>
          Paste readings
        </button>
        <button
          type="button"
          className="verb"
          disabled={readings.length === 0}
          onClick={() => copyReadings(store, readingTable(sheet))}
        >
          Copy readings
        </button>
      </div>
      <AssumedLimits sheet={sheet} />
      <Instruments sheet={sheet} remarks={remarks} />
      <Channels sheet={sheet} />
      <Angles sheet={sheet} evaluation={evaluation} />
      <Conversions />
      {pasted !== undefined && <PasteReadings text={pasted} onClose={() => setPasted(undefined)} />}
    </section>
  )
}

const NONE: readonly Remark[] = []

function remarksByPart(sheet: Sheet): ReadonlyMap<string, readonly Remark[]> {
  const found = new Map<string, readonly Remark[]>()
  for (const remark of remarksOn(sheet)) {
    found.set(remark.about, [...(found.get(remark.about) ?? []), remark])
  }
  return found
}
