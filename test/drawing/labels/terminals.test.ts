import { describe, expect, it } from 'vitest'
import { layout } from '../../../src/drawing'
import { quick } from '../../../src/sheet'
import { phasor, sheetOf } from '../sheets'

const sheet = sheetOf([
  { ...phasor('Vcoil', '24.0', '30'), from: '1', to: '2' },
  { ...phasor('V', '20.0', '90'), from: 'a', to: 'b' },
  phasor('VC', '12.0', '-90'),
])

function wordsWith(terminals: boolean): string[] {
  return layout(sheet, quick(sheet), { terminals })
    .items.filter((item) => item.kind === 'text' && item.part === 'label')
    .map((item) => (item.kind === 'text' ? item.runs.map(({ text }) => text).join('') : ''))
}

describe('the terminals of a phasor', () => {
  it('stand in its subscript on request, from the first to the second', () => {
    const words = wordsWith(true)
    expect(words.some((text) => text.startsWith('Vcoil, 1–2'))).toBe(true)
    expect(words.some((text) => text.startsWith('Va–b'))).toBe(true)
  })

  it('are left out where nobody asked, and where a phasor has none', () => {
    expect(wordsWith(false).join(' ')).not.toMatch(/–/)
    expect(wordsWith(true).some((text) => text.startsWith('VC\u00a0'))).toBe(true)
  })
})
