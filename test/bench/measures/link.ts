import { readFileSync } from 'node:fs'
import { deflateRawSync } from 'node:zlib'
import { parseSheetText, type Sheet, serializeLink } from '../../../src/sheet'
import type { Measure } from '../measure'

/** A job with readings and instruments, as the tests of the link have it. */
function twelvePhasors(): Sheet {
  const file = new URL('../../sheet/fixtures/twelve-phasors.json', import.meta.url)
  const parsed = parseSheetText(readFileSync(file, 'utf8'))
  if (!parsed.ok) throw new Error('The sheet of twelve phasors is not valid.')
  return parsed.sheet
}

export const linkAgainstDeflate: Measure = {
  name: 'link of twelve phasors, characters : plain deflate',
  goal: 0.55,
  measure: async () => {
    const sheet = twelvePhasors()
    const packed = deflateRawSync(JSON.stringify(sheet), { level: 9 }).toString('base64url')
    return serializeLink(sheet).length / `#sheet=1.${packed}`.length
  },
}

export const charactersOfLink: Measure = {
  name: 'link of twelve phasors',
  goal: 1199,
  unit: 'characters',
  measure: async () => serializeLink(twelvePhasors()).length,
}
