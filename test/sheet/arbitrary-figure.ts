import fc from 'fast-check'
import type { Place, Shown, Typed } from '../../src/sheet'
import { text, unknownFields } from './arbitrary-text'

/** Decimals as a meter shows them: digits, and the number that they are. */
const decimals: fc.Arbitrary<{ readonly digits: string; readonly value: number }> = fc
  .tuple(fc.integer({ min: 0, max: 99_999 }), fc.integer({ min: 0, max: 4 }))
  .map(([units, places]) => {
    const digits = (units / 10 ** places).toFixed(places)
    return { digits, value: Number(digits) }
  })

/** A number that is not below zero, of any size that leaves room to compute. */
export const notNegative: fc.Arbitrary<number> = fc.oneof(
  decimals.map(({ value }) => value),
  fc.double({ min: 0, max: 1e12, noNaN: true }),
  fc.constantFrom(0, 5e-324, 1e-9, 1e100),
)

/** A number above zero. */
export const positive: fc.Arbitrary<number> = notNegative.map((value) => value || 1)

/** Any number. */
export const anyNumber: fc.Arbitrary<number> = fc
  .tuple(notNegative, fc.boolean())
  .map(([value, isNegative]) => (isNegative && value !== 0 ? -value : value))

/** A place on the paper, with fields that nobody knows. */
export const place: fc.Arbitrary<Place> = fc
  .tuple(fc.record({ x: anyNumber, y: anyNumber }), unknownFields)
  .map(([known, unknown]) => ({ ...unknown, ...known }))

/** A typed value that is not below zero, with or without its digits and its limit. */
export const typedNotNegative: fc.Arbitrary<Typed> = typedFrom(
  decimals,
  notNegative,
  (digits) => digits,
)

/** A typed value above zero. */
export const typedPositive: fc.Arbitrary<Typed> = typedFrom(
  decimals.filter(({ value }) => value > 0),
  positive,
  (digits) => digits,
)

/** Any typed value. */
export const typed: fc.Arbitrary<Typed> = fc.oneof(
  typedNotNegative,
  typedPositive.map((value) => ({
    ...value,
    value: -value.value,
    ...(value.text === undefined ? {} : { text: `−${value.text}` }),
  })),
)

/** A typed angle, also one beyond half a turn. */
export const typedAngle: fc.Arbitrary<Typed> = fc
  .tuple(
    fc.integer({ min: -3599, max: 3599 }),
    fc.boolean(),
    fc.record({ limit: notNegative }, { requiredKeys: [] }),
  )
  .map(([tenths, hasText, limit]) => ({
    value: tenths / 10 || 0,
    ...(hasText ? { text: (tenths / 10).toFixed(1) } : {}),
    ...limit,
  }))

/** What a display shows of something that has no sign. */
export const shown: fc.Arbitrary<Shown> = fc.oneof(
  decimals.map(({ digits }) => digits),
  notNegative,
)

/** The same of something that is not nothing. */
export const shownPositive: fc.Arbitrary<Shown> = fc.oneof(
  decimals.filter(({ value }) => value > 0).map(({ digits }) => digits),
  positive,
)

/** What a display shows of something that has a sign. */
export const shownSigned: fc.Arbitrary<Shown> = fc.oneof(
  shown,
  decimals.map(({ digits }) => `-${digits}`),
  anyNumber,
)

function typedFrom(
  written: fc.Arbitrary<{ readonly digits: string; readonly value: number }>,
  plain: fc.Arbitrary<number>,
  toText: (digits: string) => string,
): fc.Arbitrary<Typed> {
  const value = fc.oneof(
    written.map((figure) => ({ value: figure.value, text: toText(figure.digits) })),
    plain.map((figure) => ({ value: figure })),
  )
  return fc
    .tuple(value, fc.record({ limit: notNegative }, { requiredKeys: [] }), unknownFields)
    .map(([figure, limit, unknown]) => ({ ...unknown, ...figure, ...limit }))
}

/** Texts that may be left out. */
export function texts<Name extends string>(
  ...names: readonly Name[]
): fc.Arbitrary<{ readonly [name in Name]?: string }> {
  const model = Object.fromEntries(names.map((name) => [name, text]))
  return fc.record(model, { requiredKeys: [] }) as fc.Arbitrary<{
    readonly [name in Name]?: string
  }>
}
