import fc from 'fast-check'
import type { Id, Phasor, Sheet } from '../../src/sheet'
import { notNegative, texts, typedPositive } from './arbitrary-figure'
import * as parts from './arbitrary-parts'
import { date, text, unknownFields } from './arbitrary-text'

const job = fc
  .tuple(
    texts(
      'number',
      'site',
      'circuit',
      'conditions',
      'testedBy',
      'checkedBy',
      'approvedBy',
      'notes',
    ),
    fc.record(
      {
        date,
        checkedDate: date,
        approvedDate: date,
        voided: fc.array(parts.voided, { maxLength: 2 }),
      },
      { requiredKeys: [] },
    ),
    unknownFields,
  )
  .map(([known, dated, unknown]) => ({ ...unknown, ...known, ...dated }))

const head = fc.record(
  {
    format: fc.constant('phasogon-sheet' as const),
    version: fc.constant(1 as const),
    title: text,
    revision: text,
    job,
    frequency: typedPositive,
    assumed: fc.record(
      { percent: notNegative, degrees: notNegative, elementPercent: notNegative },
      { requiredKeys: [] },
    ),
    drift: notNegative,
    safety: fc.record(
      { voltageLimit: notNegative, dischargeResistance: notNegative },
      { requiredKeys: [] },
    ),
    drawing: parts.drawing,
    report: fc
      .tuple(texts('criterion', 'conclusion'), fc.array(parts.hazard, { maxLength: 2 }))
      .map(([known, hazards]) => ({ ...known, hazards })),
  },
  { requiredKeys: ['format', 'version', 'title'] },
)

function phasorsOf(ids: readonly Id[]): fc.Arbitrary<readonly Phasor[]> {
  return fc.tuple(...ids.map((id, index) => parts.phasor(id, ids.slice(0, index))))
}

/** A list with an entry for each of a few ids. */
function listOf<Entry>(
  prefix: string,
  most: number,
  entry: (id: Id) => fc.Arbitrary<Entry>,
): fc.Arbitrary<readonly Entry[]> {
  return fc
    .integer({ min: 0, max: most })
    .chain((count) =>
      fc.tuple(...Array.from({ length: count }, (_, index) => entry(`${prefix}${index + 1}`))),
    )
}

const PHASOR_IDS = ['V1', 'I', 'Vcoil', 'x_9', 'Zz', 'A', 'abcdefghijklmnop', 'V2']

/** Any valid sheet: every part of the schema, fields that nobody knows, and texts that have broken programs. */
export const anySheet: fc.Arbitrary<Sheet> = fc
  .shuffledSubarray(PHASOR_IDS)
  .chain((ids) => fc.tuple(phasorsOf(ids), head, unknownFields))
  .chain(([phasors, details, unknown]) => {
    const base = { ...unknown, ...details, phasors }
    return phasors.length === 0 ? fc.constant<Sheet>(base) : withParts(base)
  })

function withParts(base: Sheet): fc.Arbitrary<Sheet> {
  const { phasors } = base
  return fc
    .record({
      instruments: listOf('m', 2, parts.instrument),
      channels: listOf('ct', 2, parts.channel),
      sums: listOf('s', 2, (id) => parts.sum(id, { ...NO_NAMES, phasors })),
      elements: listOf('e', 3, (id) => parts.element(id, { ...NO_NAMES, phasors })),
    })
    .chain((lists) => {
      const names = {
        phasors,
        instruments: lists.instruments.map(({ id }) => id),
        channels: lists.channels.map(({ id }) => id),
        sums: lists.sums.map(({ id }) => id),
        elements: lists.elements.map(({ id }) => id),
      }
      const anyPhasor = fc.constantFrom(...phasors.map(({ id }) => id))
      return fc
        .record(
          {
            reference: anyPhasor,
            supply: anyPhasor,
            readings: listOf('r', 5, (id) => parts.reading(id, names)),
            ...(names.elements.length > 0 ? { circuit: parts.circuit(names.elements) } : {}),
            ...(phasors.length > 2
              ? { threePhase: listOf('t', 1, (id) => parts.threePhase(id, names)) }
              : {}),
            chosen: fc.array(parts.chosen(names), { maxLength: 2 }),
            hand: listOf('h', 2, (id) => parts.handArrow(id, names)),
          },
          { requiredKeys: [] },
        )
        .map((others): Sheet => ({ ...base, ...lists, ...others }))
    })
}

const NO_NAMES = { instruments: [], channels: [], sums: [], elements: [] }
