import fc from 'fast-check'
import { expect, test } from 'vitest'
import {
  exampleSheet,
  formatErrors,
  parseSheet,
  parseSheetText,
  type SheetError,
  serializeSheet,
} from '../../src/sheet'
import { unhurried } from './laws'

const good = serializeSheet(exampleSheet)

/** The errors of a sheet; each must be a sentence. */
function errorsOf(input: unknown): readonly SheetError[] {
  return checked(parseSheet(input))
}

function checked(result: ReturnType<typeof parseSheet>): readonly SheetError[] {
  if (result.ok) throw new Error('the sheet was accepted')
  expect(result.errors.length).toBeGreaterThan(0)
  for (const { message } of result.errors) expect(message).toMatch(/^[A-Z“"][\s\S]*[.]$/u)
  return result.errors
}

/** The paths of what is wrong once the part at a path holds another value; undefined takes it away. */
function pathsWith(path: string, value: unknown): readonly string[] {
  const sheet: unknown = JSON.parse(good)
  const keys = path.split(/[.[\]]+/).filter((key) => key !== '')
  const last = keys.pop() ?? ''
  let part = sheet
  for (const key of keys) part = Reflect.get(Object(part), key)
  if (value === undefined) Reflect.deleteProperty(Object(part), last)
  else Reflect.set(Object(part), last, value)
  return errorsOf(sheet).map((error) => error.path)
}

test.each<[string, unknown]>([
  ['title', 5],
  ['title', null],
  ['revision', {}],
  ['job', 'x'],
  ['job', []],
  ['job.number', 7],
  ['job.date', '31.3.2026'],
  ['job.date', '2026-13-01'],
  ['job.date', '2026-02-29'],
  ['frequency', 50],
  ['frequency.value', 0],
  ['frequency.value', '50'],
  ['frequency.text', 50],
  ['reference', 3],
  ['reference', 'no such'],
  ['supply', ''],
  ['assumed', { percent: -1 }],
  ['drift', -0.5],
  ['phasors', {}],
  ['phasors', 'V1'],
  ['phasors[0]', null],
  ['phasors[0]', []],
  ['phasors[0].id', 'total'],
  ['phasors[0].id', 'closing'],
  ['phasors[0].id', 'constructor'],
  ['phasors[0].id', 'toString'],
  ['phasors[0].id', '1V'],
  ['phasors[0].id', 'a2345678901234567'],
  ['phasors[0].id', 'V 1'],
  ['phasors[0].label', ''],
  ['phasors[0].label', ' \u00a0'],
  ['phasors[0].label', 'x'.repeat(101)],
  ['phasors[0].label', '<b>V</b>'],
  ['phasors[0].label', '<img src=x onerror=alert(1)>'],
  ['phasors[0].label', 'V</text><script>'],
  ['phasors[0].label', 'V<!--'],
  ['phasors[0].label', 'V\u200f'],
  ['phasors[0].label', 'V\u202e42'],
  ['phasors[0].label', 'V\u0000'],
  ['phasors[0].label', 'V\ud800'],
  ['phasors[0].label', 'V\n1'],
  ['phasors[0].quantity', 'tension'],
  ['phasors[0].from', ''],
  ['phasors[0].tail', { x: 1 }],
  ['phasors[0].tail', { tipOf: 5 }],
  ['phasors[1].magnitude.value', -2.1],
  ['phasors[1].magnitude.value', null],
  ['phasors[1].magnitude.limit', -1],
  ['phasors[1].magnitude.value', undefined],
  ['phasors[1].magnitude', 2.1],
  ['phasors[1].angle', '30'],
  ['phasors[1].real', { value: 1 }],
  ['readings', 3],
  ['readings[0].kind', 'amplitude'],
  ['readings[0].kind', undefined],
  ['readings[0].kind', 'toString'],
  ['readings[0].shown', true],
  ['readings[0].shown', undefined],
  ['readings[0].shown', -0.75],
  ['readings[0].shown', '-0.75'],
  ['readings[0].shown', 'a lot'],
  ['readings[0].shown', '0.75 V'],
  ['readings[0].shown', ''],
  ['readings[0].limit', -1],
  ['readings[0].range', 0],
  ['readings[0].turns', 0],
  ['readings[0].turns', 1.5],
  ['readings[0].ratio', 0],
  ['readings[0].shunt', -0.1],
  ['readings[0].form', 'mean'],
  ['readings[0].repeats', [0.75, '0.76']],
  ['readings[0].repeats', [-0.75]],
  ['readings[0].struck', 'yes'],
  ['readings[0].of', 'Vnone'],
  ['readings[0].instrument', 'm9'],
  ['readings[0].channel', 'ct9'],
  ['readings[0].corrected', { mistake: 'sloppy', original: {} }],
  ['readings[0].corrected', { mistake: 'reversed', original: 3 }],
  ['readings[2].against', 'Vchoke'],
  ['readings[2].against', 'Vnone'],
  ['readings[2].sense', 'ahead'],
  ['instruments', [{ id: 'm1' }]],
  ['instruments', [{ id: 'm1', name: 'x', angles: 'positive' }]],
  ['instruments', [{ id: 'm1', name: 'x', accuracy: [{ of: 'speed', text: 'x' }] }]],
  ['channels', [{ id: 'ct1', ratio: { value: 0 } }]],
  ['channels', [{ id: 'ct1', phaseError: { value: 1, text: '2' } }]],
  ['sums[0].terms', {}],
  ['sums[0].terms', [{ phasor: 'Vnone' }]],
  ['sums[0].terms', [{ phasor: 'VS', sign: 2 }]],
  ['sums[0].terms', [{ phasor: 'Vmotor' }, { phasor: 'I' }]],
  ['sums[0].equals', 1],
  ['sums[0].equals', 'Vnone'],
  ['sums[0].equals', 'Vmotor'],
  ['sums[0].equals', 'I'],
  ['sums[0].arrangement', 'pile'],
  ['sums[0].start', { x: '1', y: 2 }],
  ['elements', [{ id: 'e1', kind: 'lamp', voltage: 'VS', current: 'I' }]],
  ['elements', [{ id: 'e1', kind: 'coil', voltage: 'VS', current: 'Inone' }]],
  [
    'elements',
    [{ id: 'e1', kind: 'resistor', voltage: 'VS', current: 'I', resistance: { value: -5 } }],
  ],
  ['circuit', { element: 'e9' }],
  ['circuit', { series: 'e1' }],
  ['circuit', { parallel: [{}] }],
  ['circuit', 3],
  ['threePhase', [{ id: 't1', phasors: ['VS', 'Vmotor'] }]],
  ['threePhase', [{ id: 't1', phasors: ['VS', 'VS', 'Vmotor'] }]],
  ['threePhase', [{ id: 't1', phasors: ['VS', 'Vchoke', 'Vnone'] }]],
  ['threePhase', [{ id: 't1', phasors: ['VS', 'Vchoke', 'Vmotor'], wires: 2 }]],
  ['chosen', [{ phasor: 'VS', magnitude: -1, angle: 0 }]],
  ['chosen', [{ phasor: 'Vnone', magnitude: 1, angle: 0 }]],
  ['hand', [{ id: 'h1', stands: 'Vnone', from: { x: 0, y: 0 }, to: { x: 1, y: 1 } }]],
  ['hand', [{ id: 'h1', sum: 's9', stands: 'closing', from: { x: 0, y: 0 }, to: { x: 1, y: 1 } }]],
  ['hand', [{ id: 'h1', stands: 'closing', from: { x: 0 }, to: { x: 1, y: 1 } }]],
  ['drawing', { paper: 'A2' }],
  ['drawing', { unitsPerCentimetre: { voltage: 0 } }],
  ['report', { hazards: [{ hazard: 'x', control: 'y', risk: 'none' }] }],
])('a sheet whose %s is %j is refused, and the error names the path', (path, value) => {
  const paths = pathsWith(path, value)
  const isNear = (found: string) =>
    [`${found}.`, `${found}[`].some((start) => `${path}.`.startsWith(start)) ||
    [`${path}.`, `${path}[`].some((start) => found.startsWith(start))
  expect(paths.length).toBeGreaterThan(0)
  expect(paths.filter(isNear)).toEqual(paths)
})

test('errors name the very field, in words that say what to do', () => {
  const errorAt = (path: string, value: unknown) => {
    const sheet = JSON.parse(good)
    Object.assign(sheet.phasors[1], { [path]: value })
    return errorsOf(sheet)
  }
  expect(errorAt('magnitude', { value: -1 })).toEqual([
    {
      path: 'phasors[1].magnitude.value',
      message: 'A magnitude is not negative: turn the angle by 180° instead.',
    },
  ])
  expect(errorAt('label', '<i>V</i>')).toEqual([
    {
      path: 'phasors[1].label',
      message:
        'A label is plain text, without markup: type Vcoil, and coil is set as the subscript.',
    },
  ])
  expect(errorAt('quantity', 'volts')).toEqual([
    {
      path: 'phasors[1].quantity',
      message: 'This must be one of: voltage, current, impedance, power, other.',
    },
  ])
})

test('several errors are all named', () => {
  const sheet = JSON.parse(good)
  sheet.phasors[1].magnitude.value = -1
  sheet.readings[2].sense = 'up'
  sheet.drift = 'x'
  const paths = errorsOf(sheet).map(({ path }) => path)
  expect(paths).toEqual(['drift', 'phasors[1].magnitude.value', 'readings[2].sense'])
  expect(formatErrors(errorsOf(sheet))).toBe('This must be a number. (drift) 2 more like this.')
})

test('digits must say the value beside them', () => {
  const withMagnitude = (magnitude: object) => {
    const sheet = JSON.parse(good)
    Object.assign(sheet.phasors[1], { magnitude })
    return parseSheet(sheet)
  }
  for (const magnitude of [
    { value: 23.4, text: '23.40' },
    { value: 0.23, text: '230 mV' },
    { value: 4700, text: '4k7' },
    { value: 0.1 + 0.2, text: '0.3' },
    { value: 1234.5, text: '1 234,5' },
  ]) {
    expect(withMagnitude(magnitude).ok, magnitude.text).toBe(true)
  }
  for (const magnitude of [
    { value: 23.4, text: '23.5' },
    { value: 23.4, text: '23.4 A' },
    { value: 23.4, text: 'twenty' },
    { value: 1, text: '' },
  ]) {
    const errors = checked(withMagnitude(magnitude))
    expect(errors.map(({ path }) => path)).toEqual(['phasors[1].magnitude.text'])
  }
})

test('an angle may be written beyond half a turn', () => {
  const sheet = JSON.parse(good)
  sheet.phasors[1].angle = { value: -90, text: '270' }
  expect(parseSheet(sheet).ok).toBe(true)
  sheet.phasors[1].angle = { value: 270 }
  expect(parseSheet(sheet).ok).toBe(true)
})

test('ids are unique across all parts of a sheet', () => {
  const sheet = JSON.parse(good)
  sheet.phasors[4].id = 'I'
  sheet.sums[0].equals = 0
  sheet.supply = 'I'
  expect(errorsOf(sheet)[0]).toEqual({
    path: 'phasors[4].id',
    message: 'The id "I" is taken already, by phasors[0].',
  })
  const reading = JSON.parse(good)
  reading.readings[0].id = 's1'
  expect(errorsOf(reading).map(({ path }) => path)).toEqual(['sums[0].id'])
})

test('a phasor hung on its own tip is found, however long the chain', () => {
  const hung = (count: number, last: string) => ({
    format: 'phasogon-sheet',
    version: 1,
    title: '',
    phasors: Array.from({ length: count }, (_, index) => ({
      id: `V${index}`,
      label: `V${index}`,
      quantity: 'voltage',
      tail: { tipOf: index === 0 ? last : `V${index - 1}` },
    })),
  })
  expect(errorsOf(hung(1, 'V0')).map(({ path }) => path)).toEqual(['phasors[0].tail.tipOf'])
  expect(errorsOf(hung(3, 'V2')).map(({ path }) => path)).toEqual([
    'phasors[0].tail.tipOf',
    'phasors[1].tail.tipOf',
    'phasors[2].tail.tipOf',
  ])
  expect(errorsOf(hung(3, 'V0')).map(({ path }) => path)).toEqual(['phasors[0].tail.tipOf'])
  const long = hung(2_000, 'V1999')
  expect(errorsOf(long)).toHaveLength(100)
})

test('the same element cannot stand twice in a circuit', () => {
  const sheet = JSON.parse(good)
  sheet.elements = [{ id: 'e1', kind: 'coil', voltage: 'VS', current: 'I' }]
  sheet.circuit = { series: [{ element: 'e1' }, { parallel: [{ element: 'e1' }] }] }
  expect(errorsOf(sheet).map(({ path }) => path)).toEqual(['circuit.series[1].parallel[0].element'])
})

test('numbers that JSON cannot carry are named wherever they stand', () => {
  const text = good.replace('"value": 22.4', '"value": 1e400')
  expect(checked(parseSheetText(text))).toEqual([
    {
      path: 'phasors[3].magnitude.value',
      message: 'This number is too large: the largest that can be kept is about 1.8e308.',
    },
  ])
  expect(errorsOf({ ...exampleSheet, drift: Number.NaN })[0]?.path).toBe('drift')
  expect(errorsOf({ ...exampleSheet, extra: [{ a: Number.NEGATIVE_INFINITY }] })[0]?.path).toBe(
    'extra[0].a',
  )
  expect(checked(parseSheetText(good.replace('22.4', 'NaN')))[0]?.message).toContain('not JSON')
})

test('fields that would change what an object is are refused', () => {
  const text = good.replace('"title"', '"__proto__": { "polluted": true }, "title"')
  expect(checked(parseSheetText(text)).map(({ path }) => path)).toEqual(['__proto__'])
  expect(Reflect.get({}, 'polluted')).toBeUndefined()
})

test('what is no plain value is refused', () => {
  for (const extra of [new Date(0), new Map(), () => 1, undefined, 1n, Symbol('x')]) {
    expect(errorsOf({ ...exampleSheet, extra })[0]?.path).toBe('extra')
  }
})

test('another format, and a newer version, are told at once', () => {
  for (const input of [null, 3, 'x', [], [exampleSheet]]) {
    expect(errorsOf(input)[0]?.message).toContain('This is not a sheet')
  }
  expect(errorsOf({})).toHaveLength(1)
  expect(errorsOf({ format: 'other', phasors: 3 })[0]?.path).toBe('format')
  expect(errorsOf({ ...exampleSheet, version: 2 })[0]?.message).toContain('newer version')
  for (const version of [0, '1', 0.5, undefined]) {
    const { version: _, ...rest } = exampleSheet
    const input = version === undefined ? rest : { ...rest, version }
    expect(errorsOf(input).map(({ path }) => path)).toEqual(['version'])
  }
})

test('text that is no JSON, cut short, or beyond 5 MB is refused', () => {
  for (const text of ['', ' ', 'x', good.slice(0, -10), `${good}}`, '<svg/>', '\ufeff']) {
    expect(checked(parseSheetText(text))[0]?.path).toBe('')
  }
  const large = `${good}${' '.repeat(10_000_000)}`
  expect(checked(parseSheetText(large))[0]?.message).toContain('5 MB')
  const wide = good.replace('half way', 'é'.repeat(2_600_000))
  expect(checked(parseSheetText(wide))[0]?.message).toContain('5 MB')
})

test(
  'lists, texts and nesting that are too large are refused without being gone through',
  unhurried,
  () => {
    const many = (field: string, count: number, entry: string) =>
      checked(
        parseSheetText(
          `{"format":"phasogon-sheet","version":1,"title":"","phasors":[],"${field}":[${Array(count).fill(entry).join()}]}`,
        ),
      )
    expect(many('phasors', 1_000_000, '{}')).toHaveLength(1)
    expect(many('readings', 1_000_000, '0')).toHaveLength(1)
    expect(many('hand', 9_000, '{}')).toHaveLength(100)
    expect(errorsOf({ ...exampleSheet, title: 'x'.repeat(20_001) })[0]?.path).toBe('title')
    const deep = `${'[{"a":'.repeat(200_000)}1${'}]'.repeat(200_000)}`
    const nested = good.replace('"title"', `"extra": ${deep}, "title"`)
    expect(checked(parseSheetText(nested))[0]?.message).toContain('levels deep')
    const tree = `${'{"series":['.repeat(100)}{"element":"e1"}${']}'.repeat(100)}`
    expect(
      checked(parseSheetText(good.replace('"title"', `"circuit": ${tree}, "title"`)))[0]?.path,
    ).toContain('circuit.series[0]')
  },
)

test('any script, emoji and direction may stand in free text, and in labels as letters', () => {
  const title = 'שנאי 2 \u200f⚡ <b>مضخة</b> \u202b泵\u202c\n2'
  expect(parseSheet({ ...exampleSheet, title }).ok).toBe(true)
  for (const label of ['Vמנוע', 'V泵', 'Vé', 'U₁', '⚡', 'V<10', 'a > b', 'R&D']) {
    const phasors = [{ id: 'V1', label, quantity: 'voltage' }]
    const sheet = { format: 'phasogon-sheet', version: 1, title: '', phasors }
    expect(parseSheet(sheet).ok, label).toBe(true)
  }
})

test('no JSON value, and no text, makes the reader throw', unhurried, () => {
  const mutated = fc
    .tuple(
      fc.nat(),
      fc.nat({ max: 6 }),
      fc.string({ unit: fc.constantFrom(...'{}[]",:0-eE.ntf\\u') }),
    )
    .map(([at, length, text]) => {
      const place = at % good.length
      return good.slice(0, place) + text + good.slice(place + length)
    })
  const shuffled = fc
    .jsonValue()
    .chain((value) =>
      fc
        .constantFrom(
          'phasors',
          'readings',
          'sums',
          'job',
          'circuit',
          'drawing',
          'instruments',
          'version',
        )
        .map((field) => JSON.stringify({ ...exampleSheet, [field]: value })),
    )
  const texts = fc.oneof(
    fc.string(),
    mutated,
    shuffled,
    fc.jsonValue().map((value) => JSON.stringify(value)),
  )
  fc.assert(
    fc.property(texts, (text) => {
      const result = parseSheetText(text)
      if (result.ok) expect(parseSheetText(serializeSheet(result.sheet))).toEqual(result)
      else checked(result)
    }),
    { numRuns: 2_000 },
  )
})
