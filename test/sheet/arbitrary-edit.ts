import fc from 'fast-check'
import {
  type CircuitElement,
  type CircuitPath,
  type Edit,
  newId,
  type Phasor,
  type Reading,
  type Sheet,
  type Sum,
  wiredNodes,
  wiringOf,
} from '../../src/sheet'
import {
  anyNumber,
  notNegative,
  place,
  shown,
  typed,
  typedAngle,
  typedNotNegative,
} from './arbitrary-figure'
import { hazard } from './arbitrary-parts'
import { date, label, text } from './arbitrary-text'

/** An edit that waits for the sheet it is made on; undefined where that sheet has nothing to edit so. */
export type EditOf = (sheet: Sheet) => Edit | undefined

/** Which of several: the same number picks from a list of any length. */
const which = fc.nat({ max: 999 })

function pick<Item>(items: readonly Item[] | undefined, at: number): Item | undefined {
  return items === undefined || items.length === 0 ? undefined : items[at % items.length]
}

type OnPhasor = (phasor: Phasor, sheet: Sheet) => Edit | undefined
type OnSum = (sum: Sum, sheet: Sheet) => Edit | undefined
type OnReading = (reading: Reading, sheet: Sheet) => Edit | undefined

const onPhasor =
  (make: OnPhasor) =>
  (at: number): EditOf =>
  (sheet) => {
    const phasor = pick(sheet.phasors, at)
    return phasor && make(phasor, sheet)
  }
const onSum =
  (make: OnSum) =>
  (at: number): EditOf =>
  (sheet) => {
    const sum = pick(sheet.sums, at)
    return sum && make(sum, sheet)
  }
const onReading =
  (make: OnReading) =>
  (at: number): EditOf =>
  (sheet) => {
    const reading = pick(sheet.readings, at)
    return reading && make(reading, sheet)
  }

const part = fc.constantFrom(
  'magnitude' as const,
  'angle' as const,
  'real' as const,
  'imaginary' as const,
  'whole' as const,
)
const cell = fc.oneof(
  fc.record({ form: fc.constant('number' as const), number: typed }),
  fc.record({
    form: fc.constant('limit' as const),
    limit: fc.oneof(fc.record({ absolute: notNegative }), fc.record({ percent: notNegative })),
  }),
  fc.record({
    form: fc.constant('polar' as const),
    magnitude: typedNotNegative,
    angle: typedAngle,
  }),
  fc.record({ form: fc.constant('rectangular' as const), real: typed, imaginary: typed }),
  fc.constant(null),
)

const values: fc.Arbitrary<EditOf> = fc.oneof(
  fc
    .tuple(which, part, cell)
    .map(([at, of, value]) =>
      onPhasor(({ id }) => ({ kind: 'set-value', id, part: of, value }))(at),
    ),
  fc
    .tuple(which, fc.constantFrom('typed' as const, 'read' as const))
    .map(([at, as]) => onPhasor(({ id }) => ({ kind: 'set-known', id, as }))(at)),
  fc
    .tuple(which, notNegative, anyNumber)
    .map(([at, magnitude, angle]) =>
      onPhasor(({ id }) => ({ kind: 'drag-tip', id, magnitude, angle }))(at),
    ),
)

const phasors: fc.Arbitrary<EditOf> = fc.oneof(
  fc.tuple(label, fc.constantFrom('voltage' as const, 'current' as const)).map(
    ([name, quantity]): EditOf =>
      (sheet) => ({
        kind: 'add-phasor',
        phasor: { id: newId(sheet, name), label: name, quantity },
      }),
  ),
  which.map(onPhasor(({ id }) => ({ kind: 'remove-phasor', id }))),
  which.map(onPhasor(({ id }, sheet) => ({ kind: 'duplicate-phasor', id, as: newId(sheet, id) }))),
  fc
    .tuple(which, which)
    .map(([at, to]) => onPhasor(({ id }) => ({ kind: 'move-phasor', id, to: to % 9 }))(at)),
  fc
    .tuple(which, label, fc.constantFrom('voltage' as const, 'current' as const, 'other' as const))
    .map(([at, name, quantity]) =>
      onPhasor(({ id }) => ({ kind: 'set-phasor', id, change: { label: name, quantity } }))(at),
    ),
  fc
    .tuple(which, place)
    .map(([at, tail]) => onPhasor(({ id }) => ({ kind: 'place-phasor', id, tail }))(at)),
  fc.tuple(which, which).map(([at, on]) =>
    onPhasor(({ id }, sheet) => ({
      kind: 'place-phasor',
      id,
      tail: { tipOf: pick(sheet.phasors, on)?.id ?? id },
    }))(at),
  ),
)

const sums: fc.Arbitrary<EditOf> = fc.oneof(
  which.map(
    onPhasor(({ id }, sheet) => ({
      kind: 'add-sum',
      sum: { id: newId(sheet, 's1'), terms: [{ phasor: id }], equals: 0 },
    })),
  ),
  which.map(onSum(({ id }) => ({ kind: 'remove-sum', id }))),
  fc
    .tuple(which, which)
    .map(([at, to]) => onSum(({ id }) => ({ kind: 'move-sum', id, to: to % 3 }))(at)),
  fc.tuple(which, which, fc.constantFrom(1 as const, -1 as const)).map(([at, on, sign]) =>
    onSum(({ id, terms }, sheet) => {
      const phasor = pick(sheet.phasors, on)?.id ?? ''
      return { kind: 'set-sum', id, change: { terms: [...terms, { phasor, sign }] } }
    })(at),
  ),
)

const others: fc.Arbitrary<EditOf> = fc.oneof(
  fc.tuple(which, shown).map(([at, figure]) =>
    onPhasor(({ id }, sheet) => ({
      kind: 'add-reading',
      reading: { id: newId(sheet, 'r1'), of: id, kind: 'magnitude', shown: figure },
    }))(at),
  ),
  which.map(onReading(({ id }) => ({ kind: 'remove-reading', id }))),
  fc
    .tuple(which, fc.boolean())
    .map(([at, struck]) =>
      onReading(({ id }) => ({ kind: 'set-reading', id, change: { struck, limit: null } }))(at),
    ),
  text.map(
    (title): EditOf =>
      () => ({ kind: 'set-details', title, drift: null }),
  ),
  date.map(
    (day): EditOf =>
      () => ({ kind: 'set-job', job: { date: day, notes: null } }),
  ),
  place.map(
    (origin): EditOf =>
      () => ({ kind: 'set-drawing', drawing: { origin } }),
  ),
)

const chosen: fc.Arbitrary<EditOf> = fc.oneof(
  fc
    .tuple(which, notNegative, anyNumber)
    .map(([at, magnitude, angle]) =>
      onPhasor(({ id }) => ({ kind: 'choose', chosen: [{ phasor: id, magnitude, angle }] }))(at),
    ),
  fc.constant<EditOf>(() => ({ kind: 'choose', chosen: [] })),
)

const drawn: fc.Arbitrary<EditOf> = fc.oneof(
  fc.tuple(which, fc.boolean(), place, place).map(([at, closes, from, to]) =>
    onPhasor(({ id }, sheet) => {
      const [sum] = sheet.sums ?? []
      return {
        kind: 'set-hand-arrow',
        id: sheet.hand?.[at % 3]?.id ?? newId(sheet, 'h1'),
        stands: closes ? 'closing' : id,
        ...(sum && { sum: sum.id }),
        from,
        to,
      }
    })(at),
  ),
  which.map(
    (at): EditOf =>
      (sheet) => {
        const arrow = pick(sheet.hand, at)
        return arrow && { kind: 'remove-hand-arrow', id: arrow.id }
      },
  ),
  which.map(
    (at): EditOf =>
      (sheet) => {
        const sum = pick(sheet.sums, at)
        return sum ? { kind: 'clear-hand', sum: sum.id } : { kind: 'clear-hand' }
      },
  ),
)

type OnElement = (element: CircuitElement, sheet: Sheet) => Edit | undefined

const onElement =
  (make: OnElement) =>
  (at: number): EditOf =>
  (sheet) => {
    const element = pick(sheet.elements, at)
    return element && make(element, sheet)
  }

/** The path of some node of the circuit; that of the whole where there is none. */
function pathIn(sheet: Sheet, at: number): CircuitPath {
  const wiring = wiringOf(sheet)
  return (wiring && pick([...wiredNodes(wiring)], at)?.path) ?? []
}

const form = fc.constantFrom('series' as const, 'parallel' as const)
const elementKind = fc.constantFrom(
  'resistor' as const,
  'coil' as const,
  'capacitor' as const,
  'impedance' as const,
)
const elementValue = fc.constantFrom(
  'resistance' as const,
  'inductance' as const,
  'capacitance' as const,
  'reactance' as const,
  'dcResistance' as const,
)

const circuits: fc.Arbitrary<EditOf> = fc.oneof(
  form.map(
    (joined): EditOf =>
      () => ({ kind: 'start-circuit', form: joined }),
  ),
  fc.constant<EditOf>(() => ({ kind: 'remove-circuit' })),
  fc.record({ at: which, joined: form, of: elementKind, name: fc.option(label), own: which }).map(
    ({ at, joined, of, name, own }): EditOf =>
      (sheet) => {
        const phasor = own % 3 === 0 ? pick(sheet.phasors, own)?.id : undefined
        return {
          kind: 'add-element',
          element: { kind: of, ...(name === null ? {} : { label: name }) },
          at: pathIn(sheet, at),
          form: joined,
          ...(phasor === undefined ? {} : { own: phasor }),
        }
      },
  ),
  fc.tuple(which, fc.nat({ max: 2 }), fc.integer({ min: 2, max: 3 })).map(
    ([at, from, count]): EditOf =>
      (sheet) => {
        const wiring = wiringOf(sheet)
        const groups =
          wiring && [...wiredNodes(wiring)].filter(({ branches }) => branches.length > 1)
        const group = pick(groups, at)
        return group && { kind: 'group-branches', at: group.path, from: from % 2, count }
      },
  ),
  which.map(onElement(({ id }) => ({ kind: 'remove-element', id }))),
  fc.tuple(which, label, notNegative).map(([at, name, current]) =>
    onElement(({ id }) => ({
      kind: 'set-element',
      id,
      change: { label: name, rating: { current } },
    }))(at),
  ),
  fc.tuple(which, elementValue, typedNotNegative, fc.boolean()).map(([at, value, figure, clears]) =>
    onElement(({ id }) => ({
      kind: 'set-element-value',
      id,
      value,
      typed: clears ? null : figure,
    }))(at),
  ),
  fc
    .tuple(which, fc.boolean())
    .map(([at, counts]) => onElement(({ id }) => ({ kind: 'count-element', id, counts }))(at)),
)

const reported: fc.Arbitrary<EditOf> = fc.oneof(
  fc.tuple(text, text).map(
    ([criterion, conclusion]): EditOf =>
      () => ({
        kind: 'set-report',
        report: { criterion, conclusion: conclusion || null },
      }),
  ),
  fc.tuple(hazard, which).map(
    ([added, at]): EditOf =>
      (sheet) => ({
        kind: 'add-hazard',
        hazard: added,
        at: at % (1 + (sheet.report?.hazards?.length ?? 0)),
      }),
  ),
  fc.tuple(which, text, fc.constantFrom('low' as const, 'high' as const)).map(
    ([which, control, risk]): EditOf =>
      (sheet) => {
        const count = sheet.report?.hazards?.length ?? 0
        const change = { control, risk, supervision: null }
        return count === 0 ? undefined : { kind: 'set-hazard', at: which % count, change }
      },
  ),
  which.map(
    (at): EditOf =>
      (sheet) => {
        const count = sheet.report?.hazards?.length ?? 0
        return count === 0 ? undefined : { kind: 'remove-hazard', at: at % count }
      },
  ),
)

const signed: fc.Arbitrary<EditOf> = fc
  .tuple(fc.constantFrom('checked' as const, 'approved' as const), text, date)
  .map(
    ([kind, by, day]): EditOf =>
      () => ({
        kind: 'set-job',
        job: { [`${kind}By`]: by, [`${kind}Date`]: day },
      }),
  )

/** Any edit of any kind but `several` and `add-rows`, which are made of others. */
export const anyEdit: fc.Arbitrary<EditOf> = fc.oneof(
  values,
  phasors,
  sums,
  chosen,
  drawn,
  circuits,
  reported,
  signed,
  others,
)
