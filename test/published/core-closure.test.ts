import { describe, expect, it } from 'vitest'
import { fromPolar, magnitudeOf, type Polar, resultant, type SignedTerm } from '../../src/core'
import { nameOf, outputOf, type PublishedCase, published } from './cases'

/** A phasor of a case by the names of its two outputs; an angle may be given as degrees. */
type Named = readonly [magnitude: string, angle: string | number]

function computed(from: PublishedCase, [magnitude, angle]: Named): Polar {
  return {
    magnitude: outputOf(from, magnitude).computed,
    angle: typeof angle === 'number' ? angle : outputOf(from, angle).computed,
  }
}

/** Asserts that phasors of a case, to the twelve digits we have of each, add up to one that is given. */
function closes(id: string, says: string, terms: readonly Named[], equals: Named | Polar): void {
  const from = published(id)
  it(`${nameOf(from)}: ${says}`, () => {
    const whole = 'magnitude' in equals ? equals : computed(from, equals)
    const parts = terms.map((term) => computed(from, term))
    const signed = parts.map(
      (part): SignedTerm => ({ value: fromPolar(part.magnitude, part.angle) }),
    )
    const gap = resultant([...signed, { value: fromPolar(whole.magnitude, whole.angle), sign: -1 }])
    const longest = Math.max(...parts.map((part) => part.magnitude))
    expect(magnitudeOf(gap)).toBeLessThanOrEqual(1e-11 * parts.length * longest)
  })
}

describe('published phasors close', () => {
  closes(
    'S13',
    'the drops add up to the source',
    [
      ['|ER|', 'I angle'],
      ['|EL|', 'EL angle'],
    ],
    { magnitude: 10, angle: 0 },
  )
  closes(
    'P04',
    'the drops add up to the source',
    [
      ['|EC1|', 'EC1 angle'],
      ['|ER|', 'ER angle'],
    ],
    { magnitude: 120, angle: 0 },
  )
  closes(
    'P04',
    'the drops in the branch add up to its voltage',
    [
      ['|EL|', 'EL angle'],
      ['|EC2|', 'EC2 angle'],
    ],
    ['|ER|', 'ER angle'],
  )
  closes(
    'P04',
    'the branch currents add up',
    [
      ['|IR|', 'ER angle'],
      ['|ILC|', 'ILC angle'],
    ],
    ['|I|', 'I angle'],
  )
  closes(
    'P09',
    'the branch currents add up',
    [
      ['|I1|', 'I1 angle'],
      ['|I2|', 'I2 angle'],
    ],
    ['|I|', 'I angle'],
  )
  closes(
    'P11',
    'the branch currents add up',
    [
      ['|Icoil|', 'Icoil angle'],
      ['|IC|', 90],
    ],
    ['|I|', 'I angle'],
  )
  closes(
    'P14',
    'the branch currents add up to the source',
    [
      ['|I1|', 'I1 angle'],
      ['|I2|', 'I2 angle'],
      ['|I3|', 'I3 angle'],
    ],
    { magnitude: 8, angle: 0 },
  )
  closes(
    'T13',
    'the line currents add up to nothing',
    [
      ['I line', 'IR angle'],
      ['I line', 'IY angle'],
      ['I line', 'IB angle'],
    ],
    { magnitude: 0, angle: 0 },
  )
  closes(
    'T20',
    'the currents of a star without a neutral add up to nothing',
    [
      ['|Ia|', 'Ia angle'],
      ['|Ib|', 'Ib angle'],
      ['|Ic|', 'Ic angle'],
    ],
    { magnitude: 0, angle: 0 },
  )
  closes(
    'T23',
    'the line currents and the neutral add up to nothing',
    [
      ['|Ia|', 0],
      ['|Ib|', 'Ib angle'],
      ['|Ic|', 'Ic angle'],
      ['|In|', 'In angle'],
    ],
    { magnitude: 0, angle: 0 },
  )
  closes(
    'T24',
    'the load currents add up to the line current',
    [
      ['|I1|', 'I1 angle'],
      ['|I2|', 'I2 angle'],
    ],
    ['|I|', 0],
  )
})
