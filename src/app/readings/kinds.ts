import type { Reading } from '../../sheet'

/** The kinds of readings as the page calls them, with an example of what is typed for each. */
export const KINDS: {
  readonly [kind in Reading['kind']]: { readonly name: string; readonly example: string }
} = {
  magnitude: { name: 'magnitude', example: '1.26, 4 turns' },
  angle: { name: 'angle', example: '37.1 leads' },
  shift: { name: 'shift', example: '1.3 of 8 lags' },
  ellipse: { name: 'ellipse', example: '2.1 of 4.0 rising leads' },
  power: { name: 'watts', example: '460' },
  'reactive-power': { name: 'vars', example: '120' },
  'power-factor': { name: 'power factor', example: '0.83 lags' },
}

/** Every kind, in the order of the list. */
export const KIND_LIST = Object.keys(KINDS) as readonly Reading['kind'][]

/** Whether a reading of the kind compares its phasor with another, and under which field. */
export function otherField(kind: Reading['kind']): 'against' | 'with' | undefined {
  if (kind === 'magnitude') return undefined
  return kind === 'angle' || kind === 'shift' || kind === 'ellipse' ? 'against' : 'with'
}
