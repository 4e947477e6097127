import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  type CellValue,
  differenceDegrees,
  formatAngle,
  formatLimit,
  formatPolar,
  formatQuantity,
  formatRectangular,
  parseAngle,
  parseCell,
  parseNumber,
  resolutionOf,
  type Typed,
  wrapDegrees,
} from '../../src/core'
import { degrees } from './random'

const unit = fc.constantFrom('V', 'A', 'Ω', 'VA', 'Hz', 'F', '', 'mm')
const exponent = fc.integer({ min: -9, max: 4 })
const value = fc
  .tuple(fc.double({ min: -1000, max: 1000, noNaN: true }), fc.integer({ min: -14, max: 16 }))
  .map(([figure, power]) => figure * 10 ** power)
const resolution = exponent.map((power) => Number(`1e${power}`))
/** Figures of at most twelve digits, so that each has a last digit which is no rounding's. */
const figure = fc.integer({ min: -999_999_999, max: 999_999_999 })

function read(text: string, unitOfCell: string): Typed {
  const result = parseNumber(text, { unit: unitOfCell })
  if (!result.ok) throw new Error(`${text}: ${result.problem}`)
  return result.value
}

function readCell(text: string, unitOfCell: string): CellValue {
  const result = parseCell(text, { unit: unitOfCell })
  if (!result.ok) throw new Error(`${text}: ${result.problem}`)
  return result.value
}

function readAngle(text: string): Typed {
  const result = parseAngle(text)
  if (!result.ok) throw new Error(`${text}: ${result.problem}`)
  return result.value
}

describe('what is printed can be read again', () => {
  it('as the value to its resolution, which prints the same', () => {
    fc.assert(
      fc.property(figure, exponent, unit, (digits, power, unitOfCell) => {
        const place = Number(`1e${power}`)
        const typed = Number(`${digits}e${power}`)
        const printed = formatQuantity(typed, unitOfCell, { resolution: place })
        const again = read(printed, unitOfCell).value
        expect(Math.abs(again - typed)).toBeLessThanOrEqual(4 * Number.EPSILON * Math.abs(typed))
        expect(formatQuantity(again, unitOfCell, { resolution: place })).toBe(printed)
      }),
    )
  })

  it('with the place value of its last digit', () => {
    fc.assert(
      fc.property(figure, exponent, (digits, power) => {
        const place = Number(`1e${power}`)
        const printed = formatQuantity(Number(`${digits}e${power}`), 'V', { resolution: place })
        // A single 0 needs no place value above its own.
        expect(resolutionOf(printed)).toBe(digits === 0 ? Math.min(place, 1) : place)
      }),
    )
  })

  it('as any value to four digits', () => {
    fc.assert(
      fc.property(value, unit, (any, unitOfCell) => {
        const printed = formatQuantity(any, unitOfCell)
        const again = read(printed, unitOfCell).value
        expect(Math.abs(again - any)).toBeLessThanOrEqual(0.5001e-3 * Math.abs(any))
        expect(formatQuantity(again, unitOfCell)).toBe(printed)
      }),
    )
  })

  it('as an angle to its resolution', () => {
    fc.assert(
      fc.property(degrees, fc.constantFrom(0.001, 0.01, 0.1, 1, 10), (angle, place) => {
        const printed = formatAngle(angle, { resolution: place })
        const again = readAngle(printed).value
        expect(Math.abs(differenceDegrees(again, wrapDegrees(angle)))).toBeLessThanOrEqual(
          0.5001 * place,
        )
        expect(formatAngle(again, { resolution: place })).toBe(printed)
      }),
    )
  })

  it('as magnitude and angle', () => {
    fc.assert(
      fc.property(value, degrees, unit, (any, angle, unitOfCell) => {
        const polar = { magnitude: Math.abs(any), angle }
        const printed = formatPolar(polar, unitOfCell)
        const again = readCell(printed, unitOfCell)
        if (again.form !== 'polar') throw new Error(`${printed} was read as ${again.form}`)
        expect(
          formatPolar({ magnitude: again.magnitude.value, angle: again.angle.value }, unitOfCell),
        ).toBe(printed)
        expect(again.magnitude.value).toBe(
          read(formatQuantity(polar.magnitude, unitOfCell), unitOfCell).value,
        )
        expect(again.angle.value).toBe(readAngle(formatAngle(angle)).value)
      }),
    )
  })

  it('as real and imaginary part, both to one place value', () => {
    fc.assert(
      fc.property(value, value, unit, resolution, (re, im, unitOfCell, place) => {
        fc.pre(Math.max(Math.abs(re), Math.abs(im)) < 1e14 * place)
        const printed = formatRectangular({ re, im }, unitOfCell, { resolution: place })
        const again = readCell(printed, unitOfCell)
        if (again.form !== 'rectangular') throw new Error(`${printed} was read as ${again.form}`)
        const z = { re: again.real.value, im: again.imaginary.value }
        const half = 0.5001 * place + 4 * Number.EPSILON * Math.max(Math.abs(re), Math.abs(im))
        expect(Math.abs(z.re - re)).toBeLessThanOrEqual(half)
        expect(Math.abs(z.im - im)).toBeLessThanOrEqual(half)
        expect(formatRectangular(z, unitOfCell, { resolution: place })).toBe(printed)
      }),
    )
  })

  it('as a limit that is no tighter, and at most a tenth wider', () => {
    fc.assert(
      fc.property(value.map(Math.abs), fc.constantFrom('V', 'Ω', '°', ''), (size, unitOfCell) => {
        fc.pre(unitOfCell !== '°' || size < 1e6)
        const again = readCell(formatLimit(size, unitOfCell), unitOfCell)
        if (again.form !== 'limit' || !('absolute' in again.limit))
          throw new Error('that is no limit')
        expect(again.limit.absolute).toBeGreaterThanOrEqual(size * (1 - 1e-9))
        expect(again.limit.absolute).toBeLessThanOrEqual(size * 1.1001)
      }),
    )
  })

  it('as a percentage', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 99 }),
        fc.integer({ min: -3, max: 0 }),
        (digits, power) => {
          const percent = Number(`${digits}e${power}`)
          expect(readCell(formatLimit({ percent }, 'V'), 'V')).toEqual({
            form: 'limit',
            limit: { percent },
          })
        },
      ),
    )
  })
})

/** Texts as a hand types them: digits, a point or comma, parted thousands, an exponent, a prefix, a unit. */
const typedFigure = fc
  .record({
    sign: fc.constantFrom('', '-', '−', '+'),
    whole: fc.constantFrom('0', '7', '48', '230', '1 234', '12 345', '100000'),
    decimals: fc.constantFrom('', '.', '.0', '.5', ',25', '.1250'),
    exponent: fc.constantFrom('', '', '', 'e3', 'E-3', 'e−2'),
    word: fc.constantFrom('', '', 'V', ' V', ' mV', 'mV', ' kV', 'k', ' m', 'u'),
  })
  .map((part) => `${part.sign}${part.whole}${part.decimals}${part.exponent}${part.word}`)
const typedText = fc.oneof(
  typedFigure,
  fc
    .tuple(typedFigure, fc.constantFrom('± 0.5 V', '± 1 %', '+/- 5 mV'))
    .map(([text, limit]) => `${text} ${limit}`),
  fc.constantFrom('0.24/3', '1.5/10*360 mV', '4k7', '2M2 V', '400/√3', '(48.2 ± 0.5) mV'),
)

describe('the text that is kept', () => {
  function expectSame(kept: Typed, unitOfCell: string): void {
    const { value: same } = read(kept.text ?? String(kept.value), unitOfCell)
    expect(Object.is(same, kept.value)).toBe(true)
  }

  it('reads as exactly the same value again, without its limit', () => {
    fc.assert(
      fc.property(typedText, (text) => {
        const result = parseNumber(text, { unit: 'V' })
        fc.pre(result.ok)
        if (!result.ok) return
        expectSame(result.value, 'V')
        expect(read(result.value.text ?? '', 'V').limit).toBeUndefined()
      }),
    )
  })

  it('does so for both parts of a phasor, in either form', () => {
    fc.assert(
      fc.property(
        typedText,
        typedText,
        fc.constantFrom('∠', 'at', 'j', 'j−'),
        (first, second, mark) => {
          const isPolar = mark === '∠' || mark === 'at'
          const rest = second.replace(/^[-−+]/, '')
          const text = isPolar
            ? `${first} ${mark} ${rest}`
            : `${first} ${mark === 'j' ? '+' : '−'} j${rest}`
          const result = parseCell(text, { unit: 'V' })
          if (!result.ok) {
            expect(result.problem).toMatch(/\.$/)
            return
          }
          const cell = result.value
          if (cell.form === 'polar') {
            expectSame(cell.magnitude, 'V')
            expect(readAngle(cell.angle.text ?? '').value).toBe(cell.angle.value)
          } else if (cell.form === 'rectangular') {
            expectSame(cell.real, 'V')
            expectSame(cell.imaginary, 'V')
          } else {
            throw new Error(`${text} was read as ${cell.form}`)
          }
        },
      ),
    )
  })

  it('of an angle reads as exactly the same angle again', () => {
    const mark = fc.constantFrom('', '°', ' deg', ' rad')
    fc.assert(
      fc.property(fc.integer({ min: -99999, max: 99999 }), mark, (hundredths, word) => {
        const kept = readAngle(`${hundredths / 100}${word}`)
        expect(Object.is(readAngle(kept.text ?? '').value, kept.value)).toBe(true)
      }),
    )
  })
})

describe('whatever is typed', () => {
  const characters = fc.constantFrom(
    ...'0123456789.,+-−±∠°%jieEkmMµΩVAπ√*/()<> \u00a0\u2009\u200f\u0000at'.split(''),
  )
  const nearly = fc.array(characters, { maxLength: 24 }).map((each) => each.join(''))
  const anything = fc.oneof(nearly, fc.string({ unit: 'binary', maxLength: 300 }))

  it('is read as finite values that read the same again, or refused in one whole sentence', () => {
    const part = fc.constantFrom(undefined, 'magnitude', 'angle', 'real', 'imaginary')
    const cellOptions = fc.oneof(
      fc.record({ unit: fc.constantFrom('V', 'Ω', ''), part }),
      fc.constant({ unit: '°', part: undefined }),
    )
    fc.assert(
      fc.property(anything, cellOptions, (text, options) => {
        const result = parseCell(text, options)
        if (!result.ok) {
          expect(result.problem).toMatch(/^[A-Z“].*\.$/su)
          return
        }
        const isAngleCell = options.part === 'angle' || options.unit === '°'
        for (const [name, typed] of Object.entries(result.value)) {
          if (typeof typed !== 'object' || !('value' in typed)) continue
          expect(Number.isFinite(typed.value)).toBe(true)
          expect(Number.isFinite(typed.limit ?? 0)).toBe(true)
          expect(typed.limit ?? 0).toBeGreaterThanOrEqual(0)
          const isAngle = name === 'angle' || (name === 'number' && isAngleCell)
          const kept = typed.text ?? String(typed.value)
          const again = isAngle ? readAngle(kept) : read(kept, options.unit)
          expect(Object.is(again.value, typed.value)).toBe(true)
        }
      }),
      { numRuns: 3000 },
    )
  })

  it('is read in no time, however it is built', () => {
    for (const text of [
      '1'.repeat(119),
      '1 '.repeat(60),
      '+-'.repeat(60),
      '('.repeat(120),
      'j'.repeat(119),
      '1e'.repeat(60),
      '1,'.repeat(60),
    ]) {
      expect(parseCell(text, { unit: 'V' })).toHaveProperty('ok')
    }
  })
})
