import { expect, test } from 'vitest'
import {
  describeEdit,
  exampleSheet,
  type Hazard,
  hazardsFrom,
  missingHazards,
  usualHazards,
} from '../../../src/sheet'
import { applied, refused } from '../laws'

const first: Hazard = { hazard: 'Wet floor. Cable duct', control: 'Mat', risk: 'medium' }
const second: Hazard = { hazard: 'Live parts', control: '', risk: 'high' }
const listed = applied(applied(exampleSheet, { kind: 'add-hazard', hazard: first }), {
  kind: 'add-hazard',
  hazard: second,
  at: 0,
})

test('hazards are added at the end or before another', () => {
  expect(listed.report?.hazards).toEqual([second, first])
})

test('a hazard changes field by field, and null takes one away', () => {
  const change = { risk: 'low' as const, supervision: 'Shift engineer' }
  const sheet = applied(listed, { kind: 'set-hazard', at: 1, change })
  expect(sheet.report?.hazards?.[1]).toEqual({ ...first, ...change })
  const back = applied(sheet, { kind: 'set-hazard', at: 1, change: { supervision: null } })
  expect(back.report?.hazards?.[1]).toEqual({ ...first, risk: 'low' })
})

test('the last hazard that goes takes the empty report with it', () => {
  const one = applied(listed, { kind: 'remove-hazard', at: 0 })
  expect(one.report).toEqual({ hazards: [first] })
  expect(applied(one, { kind: 'remove-hazard', at: 0 })).not.toHaveProperty('report')
})

test('criterion and conclusion are set and taken away, and the hazards stay', () => {
  const report = { criterion: 'Gap below 2 %', conclusion: 'Accepted.\nRetest in a year.' }
  const sheet = applied(listed, { kind: 'set-report', report })
  expect(sheet.report).toEqual({ ...report, hazards: [second, first] })
  const back = applied(sheet, {
    kind: 'set-report',
    report: { criterion: null, conclusion: null },
  })
  expect(back.report).toEqual(listed.report)
})

test('a hazard that is not there, or without a risk class, is refused', () => {
  expect(refused(listed, { kind: 'remove-hazard', at: 2 })).toContain('number 3')
  expect(refused(listed, { kind: 'set-hazard', at: -1, change: {} })).toContain('number 0')
  refused(listed, { kind: 'set-hazard', at: 0, change: { risk: null } })
})

test('what is done to hazards is said in words', () => {
  const wordsOf = (edit: Parameters<typeof describeEdit>[1]) => describeEdit(listed, edit)
  expect(wordsOf({ kind: 'remove-hazard', at: 1 })).toBe('Delete the hazard “Wet floor”')
  expect(wordsOf({ kind: 'add-hazard', hazard: { ...first, hazard: '' } })).toBe('Add a hazard')
  expect(wordsOf({ kind: 'set-report', report: { criterion: 'x' } })).toBe('Change the criterion')
})

test('the usual hazards can all be put on a sheet, each once', () => {
  expect(missingHazards(exampleSheet)).toEqual(usualHazards)
  const sheet = applied(exampleSheet, {
    kind: 'several',
    edits: usualHazards.slice(1).map((hazard) => ({ kind: 'add-hazard', hazard })),
  })
  expect(missingHazards(sheet)).toEqual(usualHazards.slice(0, 1))
  expect(new Set(usualHazards.map(({ hazard }) => hazard)).size).toBe(usualHazards.length)
})

test('a caution becomes a hazard of high risk whose control is still to be written, once', () => {
  const cautions = [
    { about: 'V1', text: 'Take care of this.' },
    { about: 'V2', text: 'Take care of this.' },
  ]
  const found = hazardsFrom(exampleSheet, cautions)
  expect(found).toEqual([{ hazard: 'Take care of this.', control: '', risk: 'high' }])
  const sheet = applied(exampleSheet, { kind: 'add-hazard', hazard: found[0] as Hazard })
  expect(hazardsFrom(sheet, cautions)).toEqual([])
})
