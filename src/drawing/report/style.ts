import { paletteOf } from '../theme'
import type { TextStyle } from './wrap'

/** The colours of all pages. */
export const INK = paletteOf('print')

/** How the parts of a page are lettered; ems in millimetres. */
export const STYLES = {
  name: { face: 'bold', size: 6 },
  heading: { face: 'bold', size: 3.7 },
  body: { face: 'sans', size: 2.9 },
  strong: { face: 'bold', size: 2.9 },
  caption: { face: 'sans', size: 2.3 },
  note: { face: 'sans', size: 2.5 },
} as const satisfies { readonly [name: string]: TextStyle }

/** How far apart the baselines of a style are, in ems: what ascenders and descenders need, and air. */
export const LEADING = 1.42
/** How far below the top of its line a baseline lies, in ems. */
export const BASELINE = 0.98

/** The heights of lines in millimetres. */
export function lineHeight({ size }: TextStyle): number {
  return LEADING * size
}
