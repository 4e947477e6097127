/** Conversions that a reading may need. */
export type Conversion =
  | 'turns'
  | 'ratio'
  | 'shunt'
  | 'peak'
  | 'peak-to-peak'
  | 'shift'
  | 'ellipse-rising'
  | 'ellipse-falling'
  | 'power'
  | 'reactive-power'
  | 'power-factor'
  | 'average-responding'
  | 'phase-error'
  | 'reversed'

/** The formula of a conversion as it is printed beside a reading. */
export const FORMULAS: { readonly [conversion in Conversion]: string } = {
  turns: 'current = shown ÷ turns through the clamp',
  ratio: 'value = shown × ratio',
  shunt: 'current = voltage shown ÷ resistance of the shunt',
  peak: 'rms = peak ÷ √2, for a sine',
  'peak-to-peak': 'rms = peak to peak ÷ (2√2), for a sine',
  shift: 'φ = 360° × shift ÷ period',
  'ellipse-rising': 'sin φ = intercept ÷ height, φ up to 90° as the ellipse rises to the right',
  'ellipse-falling': 'sin φ = intercept ÷ height, φ above 90° as the ellipse falls to the right',
  power: 'cos φ = P ÷ (V × I)',
  'reactive-power': 'sin φ = Q ÷ (V × I)',
  'power-factor': 'cos φ = power factor',
  'average-responding':
    'true rms = shown × form factor of the wave ÷ 1.1107 (sine 1.1107, square 1, triangle 1.1547)',
  'phase-error': 'angle = shown − phase error of the channel',
  reversed: 'connected the wrong way round: 180° more',
}
