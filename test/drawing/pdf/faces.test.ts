import { jsPDF } from 'jspdf'
import { expect, test } from 'vitest'
import { measureText } from '../../../src/drawing'
import { addFaces } from '../../../src/drawing/pdf/faces'
import { fonts } from './fonts'

const faces = addFaces(new jsPDF(), fonts)

test('the typefaces of a PDF are as wide as the page measures its own', () => {
  for (const face of ['sans', 'bold'] as const) {
    const text = 'gap 1.5 V of 1.8 V ∠ 28.7° − 0.2 Ω µ φ'
    if (!faces[face].has(text)) throw new Error(`${face} lacks a letter.`)
    expect(measureText([{ text, face, size: 1 }])).toBeCloseTo(faces[face].widthOf(text), 1)
  }
})

test.each([
  'Напряжение на вводе щита',
  'ЩИТ УПРАВЛЕНИЯ ЖЁСТКИЙ',
  'Příkon čerpadla ve strojovně',
  'Żółć, gęś, jaźń',
])('what the page lacks and the PDF has is measured as no narrower than it is: %s', (text) => {
  for (const face of ['sans', 'bold'] as const) {
    expect(faces[face].has(text)).toBe(true)
    const measured = measureText([{ text, face, size: 1 }])
    expect(measured).toBeGreaterThan(0.97 * faces[face].widthOf(text))
    expect(measured).toBeLessThan(1.2 * faces[face].widthOf(text))
  }
})
