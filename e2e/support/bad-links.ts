import { crc32, deflateRawSync } from 'node:zlib'
import { type Sheet, serializeLink } from '../../src/sheet'
import { benchSheet } from './bench'

/** A link that must not open, and what its sentence must speak of. */
export interface BadLink {
  readonly name: string
  readonly fragment: string
  readonly says: RegExp
}

const good = serializeLink(benchSheet)

/** Links that are broken, cut, newer than the page, no sheets, or made to do harm. */
export const badLinks: readonly BadLink[] = [
  { name: 'cut short', fragment: good.slice(0, -20), says: /cut short/ },
  { name: 'altered', fragment: altered(good), says: /altered/ },
  { name: 'of a newer version', fragment: good.replace('=1.', '=2.'), says: /newer version/ },
  { name: 'without a sheet', fragment: '#sheet=', says: /cut short|no sheet/ },
  { name: 'made of noise', fragment: sealed(Buffer.from('no deflate at all')), says: /sheet/ },
  { name: 'with other JSON in it', fragment: sealed(deflateRawSync('{"a":1}')), says: /sheet/ },
  {
    name: 'that inflates to gigabytes',
    // As much as fits: deflate makes some 40 kB of it, and a thousand times as much comes out.
    fragment: sealed(deflateRawSync(Buffer.alloc(40_000_000), { level: 9 })),
    says: /too large/,
  },
  {
    name: 'with markup for a label',
    fragment: serializeLink(labelled('V<img src=x onerror=alert(1)>')),
    says: /without markup/,
  },
  {
    name: 'with a label that turns the direction of writing',
    fragment: serializeLink(labelled('V\u202e1')),
    says: /invisible mark/,
  },
  {
    name: 'whose phasor hangs on its own tip',
    fragment: serializeLink({
      ...benchSheet,
      phasors: benchSheet.phasors.map((phasor) =>
        phasor.id === 'Vhung' ? { ...phasor, tail: { tipOf: 'Vhung' } } : phasor,
      ),
    }),
    says: /hang on its own tip/,
  },
]

/** Bytes in the envelope of a link: their number and checksum before them. */
function sealed(content: Buffer): string {
  const header = Buffer.alloc(6)
  header.writeUInt16BE(content.length, 0)
  header.writeUInt32BE(crc32(content), 2)
  return `#sheet=1.${Buffer.concat([header, content]).toString('base64url')}`
}

function altered(link: string): string {
  const at = Math.floor(link.length / 2)
  return `${link.slice(0, at)}${link[at] === 'A' ? 'B' : 'A'}${link.slice(at + 1)}`
}

function labelled(label: string): Sheet {
  const [first, ...rest] = benchSheet.phasors
  return first ? { ...benchSheet, phasors: [{ ...first, label }, ...rest] } : benchSheet
}
