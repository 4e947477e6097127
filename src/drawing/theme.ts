import type { Agreement, Quantity } from '../sheet'

/**
 * Which set of colours a scene is laid out in; what is exported is always light, and what is printed
 * leaves the paper white.
 */
export type Theme = 'light' | 'dark' | 'print'

/** The colours of a drawing: one ink, three greys, a hue for each quantity and one for gaps. */
export interface Palette {
  readonly paper: string
  /** Frame, resultants, title and label text. */
  readonly ink: string
  /** Captions and the small print. */
  readonly quiet: string
  /** Axes, arcs and leaders. */
  readonly thin: string
  /** The lines of the grid every 10 mm. */
  readonly grid: string
  /** The lines of the grid every millimetre. */
  readonly fineGrid: string
  readonly quantities: { readonly [quantity in Quantity]: string }
  /** A broad clear stroke over what is picked. */
  readonly selection: string
  /** Gaps between what is measured and what is calculated, and what a hand drew. */
  readonly gap: string
  /** The ink of the stamp for each verdict; words and border tell them apart as well. */
  readonly verdicts: { readonly [verdict in Agreement['verdict']]: string }
}

const light: Palette = {
  paper: '#fffefa',
  ink: '#15191f',
  quiet: '#545c66',
  thin: '#7d8791',
  grid: '#d5dcd2',
  fineGrid: '#eff2ec',
  quantities: {
    voltage: '#1d4e86',
    current: '#8f4a00',
    impedance: '#1c6b50',
    power: '#6b3a8a',
    other: '#4c545d',
  },
  selection: 'rgba(62, 132, 200, 0.22)',
  gap: '#b3205a',
  verdicts: {
    agree: '#1f6b38',
    disagree: '#a3231a',
    'not-enough': '#545c66',
    'nothing-to-check': '#31518f',
    'agree-on-correction': '#7a5200',
  },
}

const dark: Palette = {
  paper: '#1b1f24',
  ink: '#f1efe9',
  quiet: '#aab2bb',
  thin: '#7f8994',
  grid: '#333c42',
  fineGrid: '#22282d',
  quantities: {
    voltage: '#86b8ef',
    current: '#e2a75a',
    impedance: '#76c7a5',
    power: '#c79be6',
    other: '#b4bcc5',
  },
  selection: 'rgba(120, 175, 235, 0.26)',
  gap: '#f585ae',
  verdicts: {
    agree: '#7fcb95',
    disagree: '#f59385',
    'not-enough': '#aab2bb',
    'nothing-to-check': '#9db9ee',
    'agree-on-correction': '#e0b55e',
  },
}

const palettes: { readonly [theme in Theme]: Palette } = {
  light,
  dark,
  print: { ...light, paper: '#ffffff' },
}

/** The colours of a theme. */
export function paletteOf(theme: Theme): Palette {
  return palettes[theme]
}
