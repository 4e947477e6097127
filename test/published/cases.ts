import { expect } from 'vitest'
import data from './published.json'

/** A figure that a source prints, beside what exact arithmetic gives from the source's own inputs. */
export interface PublishedOutput {
  readonly name: string
  /** As the source states it: `V`, `mA`, `deg`, `rad`; empty for a pure number. */
  readonly unit: string
  readonly printed: string
  /** Half a unit of the last printed place, in the output's unit. */
  readonly tol_rounding: number
  /** From exact arithmetic on the printed inputs, to twelve significant digits. */
  readonly computed: number
  /** Exact arithmetic does not reproduce the printed figure; the case's `disagrees` says why. */
  readonly printed_disagrees?: boolean
}

/** A worked example from outside, with where it was found and how it reached us. */
export interface PublishedCase {
  readonly id: string
  readonly title: string
  readonly capability: readonly string[]
  readonly source: string
  /** `read at the source`, `through a published companion …` or `from memory`. */
  readonly status: string
  readonly inputs: { readonly [name: string]: string }
  readonly outputs: readonly PublishedOutput[]
  readonly note?: string
  readonly disagrees?: readonly string[]
}

function asRecord(inputs: object): { readonly [name: string]: string } {
  return Object.fromEntries(Object.entries(inputs).map(([name, text]) => [name, String(text)]))
}

/** Every case of `published.json`, in its order. */
export const publishedCases: readonly PublishedCase[] = data.items.map((item) => ({
  ...item,
  inputs: asRecord(item.inputs),
}))

/** The case with this id. Throws for an id that is not in `published.json`. */
export function published(id: string): PublishedCase {
  const found = publishedCases.find((each) => each.id === id)
  if (found === undefined) throw new Error(`published.json holds no case ${id}`)
  return found
}

/** The output of that name. Throws where the case has none. */
export function outputOf(from: PublishedCase, name: string): PublishedOutput {
  const found = from.outputs.find((each) => each.name === name)
  if (found === undefined) throw new Error(`case ${from.id} has no output ${name}`)
  return found
}

/** A test's name: which case, what it is about, who printed it and how that reached us. */
export function nameOf(from: PublishedCase): string {
  return `${from.id} ${from.title} (${from.source}; ${from.status})`
}

/** A whole turn, in the unit in which a source states an angle. */
const TURN: { readonly [unit: string]: number } = { deg: 360, rad: 2 * Math.PI }

/** How far two figures lie apart; two angles, the short way round. */
function distance(one: number, other: number, unit: string): number {
  const apart = Math.abs(one - other)
  const turn = TURN[unit]
  return turn === undefined ? apart : Math.min(apart % turn, turn - (apart % turn))
}

/** Two roundings of a double: what reading both figures from decimals may add to their distance. */
function roundingOf(value: number): number {
  return 2 * Number.EPSILON * Math.abs(value)
}

/**
 * Asserts that a value, in the output's own unit, is the published one: `computed` to 1 part in 10⁹
 * (where that is nothing, to 10⁻¹²), and `printed` within half a unit of its last place, unless the
 * printed figure is known to disagree with its own inputs. 350° and −10° are the same angle.
 */
export function expectPublished(output: PublishedOutput, value: number): void {
  const { name, unit, printed, computed } = output
  expect(Number.isFinite(value), `${name}: ${value} is finite`).toBe(true)
  expect(
    distance(value, computed, unit),
    `${name}: ${value} beside computed ${computed}`,
  ).toBeLessThanOrEqual(Math.max(1e-9 * Math.abs(computed), 1e-12))
  if (output.printed_disagrees === true) return
  const figure = Number(printed)
  expect(
    distance(value, figure, unit),
    `${name}: ${value} beside printed ${printed}`,
  ).toBeLessThanOrEqual(output.tol_rounding + roundingOf(figure))
}
