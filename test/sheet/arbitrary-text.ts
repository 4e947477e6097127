import fc from 'fast-check'

/** Texts that have broken programs: other scripts, marks of direction, markup, the codec's own signs. */
const ODD_TEXTS = [
  'ימין לשמאל',
  '\u200fמ\u200e 24 V',
  '\u202e4.84 V\u202c',
  '<script>alert(1)</script>',
  '<img src=x onerror=alert(1)>',
  '</metadata>]]>&amp;<!--',
  '漢字と仮名',
  '⚡🔧👩🏽‍🔧',
  'a|b||c',
  '"quoted", \\backslash\\',
  'Zeile 1\nZeile 2\tTab\r\n',
  'e\u0301 ≠ é',
  '\u2028\u2029\ufeff',
  '#sheet=1.AAAA',
  '__proto__',
]

const UNPRINTABLE = /(?![\t\n\r])\p{Cc}|\p{Cs}|\p{Noncharacter_Code_Point}/u

/** Any text that a sheet may hold. */
export const text: fc.Arbitrary<string> = fc.oneof(
  fc.constantFrom(...ODD_TEXTS),
  fc.string({ unit: 'grapheme', maxLength: 12 }).filter((value) => !UNPRINTABLE.test(value)),
  fc.constantFrom('', 'Pump 2', 'CAT III 600 V', '±(1.5 % + 5 digits)'),
)

/** Any label: one line of plain text, in any script. */
export const label: fc.Arbitrary<string> = fc.oneof(
  fc.constantFrom('V1', 'Vcoil', 'I', 'Vיסוד', '電圧', 'V⚡', 'V|R', 'V & R', 'U1 < U2', 'Z"2"'),
  fc
    .string({ unit: 'grapheme', minLength: 1, maxLength: 8 })
    .filter(
      (value) =>
        value.trim() !== '' &&
        !/\p{Cc}|\p{Cs}|\p{Bidi_Control}|\p{Noncharacter_Code_Point}|</u.test(value),
    ),
)

/** Any day, as ISO 8601 has it. */
export const date: fc.Arbitrary<string> = fc
  .date({ min: new Date('1990-01-01'), max: new Date('2090-01-01'), noInvalidDate: true })
  .map((day) => day.toISOString().slice(0, 10))

const KNOWN_TO_BREAK = ['constructor', 'toString', 'x-note', 'אחר', '1', ' ', 'prototype', 'length']

/** Fields that the schema does not know, with anything that JSON can carry in them. */
export const unknownFields: fc.Arbitrary<object> = fc.oneof(
  { weight: 4, arbitrary: fc.constant({}) },
  {
    weight: 1,
    arbitrary: fc
      .dictionary(fc.constantFrom(...KNOWN_TO_BREAK), fc.jsonValue({ maxDepth: 2 }), { maxKeys: 2 })
      .map((fields) => JSON.stringify(fields))
      .filter((json) => !json.includes('"__proto__":'))
      .map((json): object => JSON.parse(json)),
  },
)
