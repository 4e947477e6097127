import fc from 'fast-check'
import { expect, test } from 'vitest'
import {
  apply,
  type Edit,
  emptySheet,
  partedFrom,
  type Sheet,
  wiredNodes,
  wiringOf,
} from '../../../src/sheet'
import { expectValid, unhurried } from '../laws'

const which = fc.nat({ max: 999 })

function pick<Item>(items: readonly Item[], at: number): Item | undefined {
  return items.length === 0 ? undefined : items[at % items.length]
}

function paths(sheet: Sheet) {
  const wiring = wiringOf(sheet)
  return wiring === undefined ? [] : [...wiredNodes(wiring)]
}

type Make = (sheet: Sheet) => Edit | undefined

const builds: fc.Arbitrary<Make> = fc.oneof(
  {
    weight: 5,
    arbitrary: fc
      .record({
        at: which,
        form: fc.constantFrom('series' as const, 'parallel' as const),
        kind: fc.constantFrom('resistor' as const, 'coil' as const, 'capacitor' as const),
      })
      .map(
        ({ at, form, kind }): Make =>
          (sheet) => ({
            kind: 'add-element',
            element: { kind },
            at: pick(paths(sheet), at)?.path ?? [],
            form,
          }),
      ),
  },
  {
    weight: 2,
    arbitrary: fc.tuple(which, which).map(
      ([at, from]): Make =>
        (sheet) => {
          const group = pick(
            paths(sheet).filter(({ branches }) => branches.length > 1),
            at,
          )
          const first = from % Math.max(1, (group?.branches.length ?? 0) - 1)
          return group && { kind: 'group-branches', at: group.path, from: first, count: 2 }
        },
    ),
  },
  {
    weight: 2,
    arbitrary: which.map(
      (at): Make =>
        (sheet) => {
          const element = pick(sheet.elements ?? [], at)
          return element && { kind: 'remove-element', id: element.id }
        },
    ),
  },
  {
    weight: 3,
    arbitrary: which.map(
      (at): Make =>
        (sheet) => {
          const phasor = pick(sheet.phasors, at)
          const number = { value: 1.5 + at }
          return (
            phasor && {
              kind: 'set-value',
              id: phasor.id,
              part: 'magnitude',
              value: { form: 'number', number },
            }
          )
        },
    ),
  },
)

test(
  'however a circuit is built, the sheet is that of the circuit, and nothing typed is lost',
  unhurried,
  () => {
    fc.assert(
      fc.property(
        fc.constantFrom('series' as const, 'parallel' as const),
        fc.array(builds, { minLength: 10, maxLength: 40, size: 'max' }),
        (form, makes) => {
          let sheet = emptySheet()
          const edits = [(): Edit => ({ kind: 'start-circuit', form }), ...makes]
          for (const make of edits) {
            const edit = make(sheet)
            const after = edit && apply(sheet, edit)
            if (!after?.ok) continue
            const typed = sheet.phasors.filter(({ magnitude }) => magnitude !== undefined)
            const left = new Map(after.value.phasors.map((each) => [each.id, each]))
            if (edit?.kind !== 'set-value') {
              for (const phasor of typed) expect(left.get(phasor.id)).toEqual(phasor)
            }
            expect(partedFrom(after.value)).toEqual([])
            sheet = after.value
          }
          expectValid(sheet)
          const inTree = paths(sheet).flatMap(({ element }) => element?.id ?? [])
          expect([...inTree].sort()).toEqual((sheet.elements ?? []).map(({ id }) => id).sort())
          for (const { node, sum } of paths(sheet)) {
            if (!('element' in node) && inTree.length > 0) expect(sum).toBeDefined()
          }
        },
      ),
      { seed: 61_140, numRuns: 150 },
    )
  },
)
