import fc from 'fast-check'
import type {
  Channel,
  CircuitElement,
  CircuitNode,
  Drawing,
  HandArrow,
  Hazard,
  Id,
  Instrument,
  Phasor,
  PhasorId,
  Reading,
  Sum,
  ThreePhase,
  VoidedSignature,
} from '../../src/sheet'
import {
  anyNumber,
  notNegative,
  place,
  positive,
  shown,
  shownPositive,
  shownSigned,
  typed,
  typedAngle,
  typedNotNegative,
  typedPositive,
} from './arbitrary-figure'
import { date, label, text, unknownFields } from './arbitrary-text'

/** The ids that a part may name. */
export interface Names {
  readonly phasors: readonly Phasor[]
  readonly instruments: readonly Id[]
  readonly channels: readonly Id[]
  readonly sums: readonly Id[]
  readonly elements: readonly Id[]
}

const flag = fc.boolean()
const turns = fc.integer({ min: 1, max: 10 })
const sense = fc.constantFrom('leads' as const, 'lags' as const)
const quantity = fc.constantFrom(
  'voltage' as const,
  'voltage' as const,
  'current' as const,
  'impedance' as const,
  'power' as const,
  'other' as const,
)

/** A part with fields that nobody knows. */
function loose<Part extends object>(part: fc.Arbitrary<Part>): fc.Arbitrary<Part> {
  return fc.tuple(part, unknownFields).map(([known, unknown]) => ({ ...unknown, ...known }))
}

/** A phasor that may hang on the tip of one of those before it. */
export function phasor(id: PhasorId, before: readonly PhasorId[]): fc.Arbitrary<Phasor> {
  const tail =
    before.length === 0 ? place : fc.oneof(place, fc.record({ tipOf: fc.constantFrom(...before) }))
  const value = fc.oneof(
    fc.record({ magnitude: typedNotNegative, angle: typedAngle }, { requiredKeys: [] }),
    fc.record({ real: typed, imaginary: typed }),
  )
  const common = fc.record(
    { id: fc.constant(id), label, quantity, from: label, to: label, tail },
    { requiredKeys: ['id', 'label', 'quantity'] },
  )
  return loose(fc.tuple(common, value).map(([known, figures]) => ({ ...known, ...figures })))
}

const mistake = fc.constantFrom(
  'reversed' as const,
  'peak-as-rms' as const,
  'one-reading-off' as const,
  'element-decade-slip' as const,
)

const corrected = loose(
  fc.record(
    {
      mistake,
      original: fc.constant({ shown: '3.41', kind: 'angle', id: 'r1' }),
      by: text,
      date,
      reason: text,
    },
    { requiredKeys: ['mistake', 'original'] },
  ),
)

/** A reading of one phasor, of any kind. */
export function reading(id: Id, { phasors, instruments, channels }: Names): fc.Arbitrary<Reading> {
  return fc.constantFrom(...phasors.map((known) => known.id)).chain((of) => {
    const other = fc.constantFrom(...phasors.map((known) => known.id))
    const others = phasors.length > 1 ? other.filter((known) => known !== of) : undefined
    const maybeChannel = channels.length > 0 ? { channel: fc.constantFrom(...channels) } : {}
    const maybeInstrument =
      instruments.length > 0 ? { instrument: fc.constantFrom(...instruments) } : {}
    const common = fc.record(
      {
        id: fc.constant(id),
        of: fc.constant(of),
        ...maybeInstrument,
        ...maybeChannel,
        range: positive,
        limit: notNegative,
        pass: text,
        struck: flag,
        corrected,
      },
      { requiredKeys: ['id', 'of'] },
    )
    const kinds: fc.Arbitrary<object>[] = [
      fc.record(
        {
          kind: fc.constant('magnitude'),
          shown,
          form: fc.constantFrom('rms', 'peak', 'peak-to-peak'),
          turns,
          ratio: positive,
          shunt: positive,
          repeats: fc.array(notNegative, { maxLength: 3 }),
        },
        { requiredKeys: ['kind', 'shown'] },
      ),
    ]
    const against = others === undefined ? {} : { against: others }
    kinds.push(
      fc.record(
        { kind: fc.constant('angle'), shown: shownSigned, sense, ...against },
        { requiredKeys: ['kind', 'shown'] },
      ),
      fc.record(
        { kind: fc.constant('shift'), shift: shown, period: shownPositive, sense, ...against },
        { requiredKeys: ['kind', 'shift', 'period', 'sense'] },
      ),
      fc.record(
        {
          kind: fc.constant('ellipse'),
          intercept: shown,
          height: shownPositive,
          tilt: fc.constantFrom('rising', 'falling'),
          sense,
          ...against,
        },
        { requiredKeys: ['kind', 'intercept', 'height'] },
      ),
    )
    if (others !== undefined) {
      kinds.push(
        fc.record(
          {
            kind: fc.constantFrom('power', 'reactive-power'),
            shown: shownSigned,
            with: others,
            ratio: positive,
            ...(channels.length > 0 ? { currentChannel: fc.constantFrom(...channels) } : {}),
          },
          { requiredKeys: ['kind', 'shown', 'with'] },
        ),
        fc.record(
          {
            kind: fc.constant('power-factor'),
            shown: fc.constantFrom(0.8, '0.85', -0.3),
            with: others,
            sense,
          },
          { requiredKeys: ['kind', 'shown', 'with'] },
        ),
      )
    }
    return loose(
      fc
        .tuple(common, fc.oneof(...kinds))
        .map(([known, kind]) => ({ ...known, ...kind }) as Reading),
    )
  })
}

/** A meter. */
export function instrument(id: Id): fc.Arbitrary<Instrument> {
  return loose(
    fc.record(
      {
        id: fc.constant(id),
        name: text,
        serial: text,
        calibrationDue: date,
        category: text,
        responding: fc.constantFrom('true-rms' as const, 'average' as const),
        angles: fc.constantFrom('lead-positive' as const, 'lag-positive' as const),
        inputResistance: typedNotNegative,
        accuracy: fc.array(
          fc.record(
            {
              of: fc.constantFrom(
                'voltage' as const,
                'current' as const,
                'angle' as const,
                'time' as const,
              ),
              range: positive,
              text,
            },
            { requiredKeys: ['of', 'text'] },
          ),
          { maxLength: 3 },
        ),
      },
      { requiredKeys: ['id', 'name'] },
    ),
  )
}

/** A transformer, probe or clamp. */
export function channel(id: Id): fc.Arbitrary<Channel> {
  return loose(
    fc.record(
      {
        id: fc.constant(id),
        label,
        ratio: typedPositive,
        turns,
        phaseError: typedAngle,
        reversed: flag,
      },
      { requiredKeys: ['id'] },
    ),
  )
}

/** A sum of phasors of one quantity, which may have to equal another of them. */
export function sum(id: Id, { phasors }: Names): fc.Arbitrary<Sum> {
  return fc.constantFrom(...phasors).chain((first) => {
    const alike = phasors
      .filter((known) => known.quantity === first.quantity)
      .map((known) => known.id)
    return fc.subarray(alike, { minLength: 0 }).chain((terms) => {
      const free = alike.filter((known) => !terms.includes(known))
      const equals =
        free.length > 0
          ? fc.constantFrom<(PhasorId | 0)[]>(0, ...free)
          : fc.constant<PhasorId | 0>(0)
      const sign = fc.record(
        { sign: fc.constantFrom(1 as const, -1 as const) },
        { requiredKeys: [] },
      )
      return loose(
        fc.record(
          {
            id: fc.constant(id),
            label,
            terms: fc.tuple(
              ...terms.map((term) => sign.map((signed) => ({ phasor: term, ...signed }))),
            ),
            equals,
            arrangement: fc.constantFrom('tip-to-tail' as const, 'from-origin' as const),
            start: place,
          },
          { requiredKeys: ['id', 'terms'] },
        ),
      )
    })
  })
}

/** An element of a circuit, of any kind. */
export function element(id: Id, { phasors }: Names): fc.Arbitrary<CircuitElement> {
  const anyPhasor = fc.constantFrom(...phasors.map((known) => known.id))
  const common = fc.record(
    {
      id: fc.constant(id),
      label,
      voltage: anyPhasor,
      current: anyPhasor,
      rating: fc.record({ voltage: notNegative, current: notNegative }, { requiredKeys: [] }),
      marked: fc.record(
        {
          resistance: typedNotNegative,
          inductance: typedNotNegative,
          capacitance: typedNotNegative,
          reactance: typed,
        },
        { requiredKeys: [] },
      ),
    },
    { requiredKeys: ['id', 'voltage', 'current'] },
  )
  const kinds: fc.Arbitrary<object> = fc.oneof(
    fc.record(
      { kind: fc.constant('resistor'), resistance: typedNotNegative },
      { requiredKeys: ['kind'] },
    ),
    fc.record(
      {
        kind: fc.constant('coil'),
        resistance: typedNotNegative,
        inductance: typedNotNegative,
        dcResistance: typedNotNegative,
      },
      { requiredKeys: ['kind'] },
    ),
    fc.record(
      {
        kind: fc.constant('capacitor'),
        capacitance: typedNotNegative,
        resistance: typedNotNegative,
      },
      { requiredKeys: ['kind'] },
    ),
    fc.record(
      { kind: fc.constant('impedance'), resistance: typed, reactance: typed },
      { requiredKeys: ['kind'] },
    ),
  )
  return loose(
    fc.tuple(common, kinds).map(([known, kind]) => ({ ...known, ...kind }) as CircuitElement),
  )
}

/** A circuit of all these elements, in series and in parallel. */
export function circuit(elements: readonly Id[]): fc.Arbitrary<CircuitNode> {
  const [first = '', ...others] = elements
  if (others.length === 0) return fc.constant({ element: first })
  return fc
    .tuple(fc.integer({ min: 1, max: others.length }), flag)
    .chain(([at, isSeries]) =>
      fc
        .tuple(circuit(elements.slice(0, at)), circuit(elements.slice(at)))
        .map((nodes) => (isSeries ? { series: nodes } : { parallel: nodes })),
    )
}

/** A three-phase system. */
export function threePhase(id: Id, { phasors }: Names): fc.Arbitrary<ThreePhase> {
  const three = fc
    .shuffledSubarray(
      phasors.map((known) => known.id),
      { minLength: 3, maxLength: 3 },
    )
    .map(([a = '', b = '', c = '']): [Id, Id, Id] => [a, b, c])
  return loose(
    fc.record(
      {
        id: fc.constant(id),
        label,
        phasors: three,
        kind: fc.constantFrom('phase' as const, 'line' as const),
        connection: fc.constantFrom('star' as const, 'delta' as const),
        wires: fc.constantFrom(3 as const, 4 as const),
        neutral: fc.constantFrom(...phasors.map((known) => known.id)),
        names: fc.tuple(label, label, label),
        currents: three,
      },
      { requiredKeys: ['id', 'phasors'] },
    ),
  )
}

/** An arrow that a hand drew. */
export function handArrow(id: Id, { phasors, sums }: Names): fc.Arbitrary<HandArrow> {
  return loose(
    fc.record(
      {
        id: fc.constant(id),
        ...(sums.length > 0 ? { sum: fc.constantFrom(...sums) } : {}),
        stands: fc.constantFrom('closing', ...phasors.map((known) => known.id)),
        from: place,
        to: place,
      },
      { requiredKeys: ['id', 'stands', 'from', 'to'] },
    ),
  )
}

/** How a sheet is drawn. */
export const drawing: fc.Arbitrary<Drawing> = loose(
  fc.record(
    {
      paper: fc.constantFrom('A4' as const, 'A3' as const, 'Letter' as const),
      orientation: fc.constantFrom('landscape' as const, 'portrait' as const),
      origin: place,
      unitsPerCentimetre: fc.record(
        {
          voltage: positive,
          current: positive,
          impedance: positive,
          power: positive,
          other: positive,
        },
        { requiredKeys: [] },
      ),
      tolerance: fc.record(
        { millimetres: notNegative, degrees: notNegative },
        { requiredKeys: [] },
      ),
    },
    { requiredKeys: [] },
  ),
)

/** A signature that no longer holds. */
export const voided: fc.Arbitrary<VoidedSignature> = fc.record(
  {
    kind: fc.constantFrom('checked' as const, 'approved' as const),
    by: text,
    date,
    revision: text,
  },
  { requiredKeys: ['kind', 'by'] },
)

/** A hazard and its control. */
export const hazard: fc.Arbitrary<Hazard> = loose(
  fc.record(
    {
      hazard: text,
      control: text,
      risk: fc.constantFrom('low' as const, 'medium' as const, 'high' as const),
      supervision: text,
    },
    { requiredKeys: ['hazard', 'control', 'risk'] },
  ),
)

/** Which of several solutions is meant. */
export function chosen({ phasors }: Names) {
  return loose(
    fc.record({
      phasor: fc.constantFrom(...phasors.map((known) => known.id)),
      magnitude: notNegative,
      angle: anyNumber,
    }),
  )
}
