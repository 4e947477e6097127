import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  apply,
  type Edit,
  exampleSheet,
  fingerprintOf,
  type Sheet,
  signatureOf,
  voidedBetween,
  voidedSignatureOf,
} from '../../src/sheet'
import { anyEdit } from './arbitrary-edit'
import { anySheet } from './arbitrary-sheet'
import { applied, unhurried } from './laws'

const checked = applied(exampleSheet, {
  kind: 'set-job',
  job: { checkedBy: 'A. Berg', checkedDate: '2026-11-30' },
})
const approved = applied(checked, { kind: 'set-job', job: { approvedBy: 'C. Dahl' } })
const anotherReading: Edit = { kind: 'set-reading', id: 'r2', change: { shown: '29.1' } }

describe('an edit of a signed sheet', () => {
  test('voids every signature, keeps the names readable, and raises the revision', () => {
    const sheet = applied(approved, anotherReading)
    expect(signatureOf(sheet, 'checked')).toBeUndefined()
    expect(signatureOf(sheet, 'approved')).toBeUndefined()
    expect(sheet.revision).toBe('1')
    expect(sheet.job?.voided).toEqual([
      { kind: 'checked', by: 'A. Berg', date: '2026-11-30', revision: '0' },
      { kind: 'approved', by: 'C. Dahl', revision: '0' },
    ])
    expect(sheet.job).not.toHaveProperty('checkedDate')
    expect(sheet.job?.site).toBe(exampleSheet.job?.site)
  })

  test('that raises the revision itself keeps its own', () => {
    const sheet = applied(checked, { kind: 'set-details', revision: 'C' })
    expect(sheet.revision).toBe('C')
    expect(voidedSignatureOf(sheet, 'checked')?.revision).toBe('0')
  })

  test('that signs anew keeps its own signature', () => {
    const edits: readonly Edit[] = [
      anotherReading,
      { kind: 'set-job', job: { checkedBy: 'E. Falk', checkedDate: '2026-12-01' } },
    ]
    const sheet = applied(checked, { kind: 'several', edits })
    expect(signatureOf(sheet, 'checked')).toEqual({ by: 'E. Falk', date: '2026-12-01' })
    expect(voidedBetween(checked, sheet).map(({ by }) => by)).toEqual(['A. Berg'])
  })

  test('that puts in what stands there already voids nothing', () => {
    const { shown } = (checked.readings ?? [])[1] as { shown: string }
    const sheet = applied(checked, { kind: 'set-reading', id: 'r2', change: { shown } })
    expect(sheet).toEqual(checked)
  })

  test.each<Edit>([
    { kind: 'set-job', job: { approvedBy: 'C. Dahl', approvedDate: '2026-12-01' } },
    { kind: 'set-job', job: { checkedDate: '2026-12-01' } },
    { kind: 'set-drawing', drawing: { paper: 'Letter', orientation: 'portrait', origin: null } },
  ])('that only signs or takes other paper voids nothing: %j', (edit) => {
    const sheet = applied(checked, edit)
    expect(signatureOf(sheet, 'checked')?.by).toBe('A. Berg')
    expect(sheet.revision).toBe('0')
  })
})

test('a sheet without signatures keeps its revision', () => {
  const blank = applied(exampleSheet, { kind: 'set-job', job: { checkedBy: '  ' } })
  expect(applied(blank, anotherReading).revision).toBe('0')
})

test('a voided signature is shown until the next of its kind is given', () => {
  const changed = applied(checked, anotherReading)
  expect(voidedSignatureOf(changed, 'checked')?.by).toBe('A. Berg')
  const again = applied(changed, { kind: 'set-job', job: { checkedBy: 'E. Falk' } })
  expect(voidedSignatureOf(again, 'checked')).toBeUndefined()
  expect(again.job?.voided?.length).toBe(1)
})

test(
  'for any edit of any sheet: signatures are voided where the data changed, and only there',
  unhurried,
  () => {
    fc.assert(
      fc.property(anySheet, anyEdit, (sheet, editOf) => {
        const edit = editOf(sheet)
        if (edit === undefined) return
        const before: Sheet = { ...sheet, job: { ...sheet.job, checkedBy: 'A. Berg' } }
        const result = apply(before, edit)
        if (!result.ok) return
        const voided = voidedBetween(before, result.value).map(({ by }) => by)
        const isChanged = fingerprintOf(before) !== fingerprintOf(result.value)
        expect(voided.includes('A. Berg')).toBe(isChanged)
      }),
    )
  },
)
