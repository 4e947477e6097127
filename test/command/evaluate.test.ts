import { spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, expect, test } from 'vitest'
import {
  emptySheet,
  exampleSheet,
  fingerprintOf,
  type Sheet,
  serializeSheet,
} from '../../src/sheet'
import { evaluate } from '../../src/sheet/estimate'

const project = fileURLToPath(new URL('../..', import.meta.url))
/** Starting a program takes as long as the machine is busy. */
const unhurried = { timeout: 600_000 }
let folder = ''

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'evaluate-'))
  mkdirSync(join(folder, 'deep'))
  const text = serializeSheet(exampleSheet)
  const line = JSON.stringify(exampleSheet)
  write('sheet.json', text)
  write('circuit.json', serializeSheet(circuit))
  write('deep/Ünïcode name.json', `\ufeff${text}`)
  write('drawing.svg', `<?xml version="1.0"?><svg><metadata><![CDATA[${text}]]></metadata></svg>`)
  write(
    'print.pdf',
    `%PDF-1.7\n1 0 obj\n<< /Type /EmbeddedFile >>\nstream\n${text}\nendstream\nendobj\n%%EOF\n`,
  )
  write('bare.svg', '<svg/>')
  write('many.jsonl', `${line}\r\n\n{"format":"phasogon-sheet"\n${line}`)
  write('wrong.json', text.replace('"value": 22.4', '"value": -22.4'))
  write('huge.json', `${text}${' '.repeat(10_000_000)}`)
  write('long.jsonl', `${line}${' '.repeat(6_000_000)}\n${line}\n`)
})

afterAll(() => rmSync(folder, { recursive: true }))

function write(name: string, text: string): void {
  writeFileSync(join(folder, name), text)
}

/** Runs the command in the project, as npm does, with the caller's folder in the environment. */
function run(...files: readonly string[]) {
  const { stdout, stderr, status } = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'src/command/evaluate.ts', ...files],
    { cwd: project, env: { ...process.env, INIT_CWD: folder }, encoding: 'utf8' },
  )
  const lines: readonly object[] = stdout
    .split('\n')
    .slice(0, -1)
    .map((line) => JSON.parse(line))
  return { lines, complaint: stderr, status }
}

const example = evaluate(exampleSheet)
const circuit: Sheet = {
  ...emptySheet(),
  frequency: { value: 50 },
  supply: 'VS',
  phasors: [
    { id: 'VS', label: 'VS', quantity: 'voltage', magnitude: { value: 24, limit: 0.1 } },
    { id: 'I', label: 'I', quantity: 'current' },
    { id: 'VR', label: 'VR', quantity: 'voltage' },
    { id: 'Vcoil', label: 'Vcoil', quantity: 'voltage' },
    { id: 'VC', label: 'VC', quantity: 'voltage' },
  ],
  sums: [
    { id: 's1', terms: [{ phasor: 'VR' }, { phasor: 'Vcoil' }, { phasor: 'VC' }], equals: 'VS' },
  ],
  elements: [
    {
      id: 'R',
      kind: 'resistor',
      voltage: 'VR',
      current: 'I',
      marked: { resistance: { value: 9 } },
    },
    {
      id: 'coil',
      kind: 'coil',
      voltage: 'Vcoil',
      current: 'I',
      marked: { resistance: { value: 3 }, inductance: { value: 0.02 } },
    },
    {
      id: 'C',
      kind: 'capacitor',
      voltage: 'VC',
      current: 'I',
      marked: { capacitance: { value: 470e-6 } },
    },
  ],
  circuit: { series: [{ element: 'R' }, { element: 'coil' }, { element: 'C' }] },
}

test(
  'sheets are evaluated in order, from files and from drawings, as the page evaluates them',
  unhurried,
  () => {
    const { lines, complaint, status } = run(
      'drawing.svg',
      'deep/Ünïcode name.json',
      join(folder, 'sheet.json'),
      'circuit.json',
    )
    expect(lines).toEqual([
      { file: 'drawing.svg', ...example },
      { file: 'deep/Ünïcode name.json', ...example },
      { file: join(folder, 'sheet.json'), ...example },
      { file: 'circuit.json', ...evaluate(circuit) },
    ])
    expect(lines[3]).toMatchObject({
      comparison: [{ phasor: 'VS' }, {}, {}, {}, {}],
      power: [{ of: 'R' }, { of: 'coil' }, { of: 'C' }, { of: 'total' }],
      resonance: { frequency: expect.closeTo(51.9, 1) },
    })
    expect(complaint).toBe('')
    expect(status).toBe(0)
  },
)

test(
  'the fingerprint on a print can be checked from the file and from the print',
  unhurried,
  () => {
    const { lines, status } = run('--fingerprint', 'sheet.json', 'print.pdf', 'bare.svg')
    const fingerprint = fingerprintOf(exampleSheet)
    expect(lines).toEqual([
      { file: 'sheet.json', ...example, fingerprint },
      { file: 'print.pdf', ...example, fingerprint },
      { file: 'bare.svg', errors: [{ path: '', message: expect.stringContaining('no sheet') }] },
    ])
    expect(status).toBe(2)
  },
)

test('a file of many sheets is answered line by line, blank lines passed over', unhurried, () => {
  const { lines, status } = run('many.jsonl')
  expect(lines).toEqual([
    { file: 'many.jsonl', line: 1, ...example },
    {
      file: 'many.jsonl',
      line: 3,
      errors: [{ path: '', message: expect.stringContaining('cut short') }],
    },
    { file: 'many.jsonl', line: 4, ...example },
  ])
  expect(status).toBe(2)
})

test(
  'what is wrong is named by its path, the other sheets are evaluated, and the status is 2',
  unhurried,
  () => {
    const { lines, complaint, status } = run(
      'wrong.json',
      'missing.json',
      'deep',
      'bare.svg',
      'huge.json',
      'long.jsonl',
      'sheet.json',
    )
    expect(lines).toEqual([
      {
        file: 'wrong.json',
        errors: [
          {
            path: 'phasors[3].magnitude.value',
            message: 'A magnitude is not negative: turn the angle by 180° instead.',
          },
        ],
      },
      { file: 'missing.json', errors: [{ path: '', message: 'There is no such file.' }] },
      { file: 'deep', errors: [{ path: '', message: 'This is a folder, not a file.' }] },
      { file: 'bare.svg', errors: [{ path: '', message: expect.stringContaining('no sheet') }] },
      { file: 'huge.json', errors: [{ path: '', message: expect.stringContaining('5 MB') }] },
      {
        file: 'long.jsonl',
        line: 1,
        errors: [{ path: '', message: expect.stringContaining('5 MB') }],
      },
      { file: 'long.jsonl', line: 2, ...example },
      { file: 'sheet.json', ...example },
    ])
    expect(complaint).toBe('')
    expect(status).toBe(2)
  },
)

test('without a file the command says how it is called', unhurried, () => {
  const { lines, complaint, status } = run()
  expect(lines).toEqual([])
  expect(complaint).toContain('FILE')
  expect(status).toBe(2)
})
