/** One phasor of the job: what is typed in its row. */
export interface JobPhasor {
  readonly label: string
  readonly quantity: 'voltage' | 'current'
  readonly magnitude: string
  readonly angle: string
  readonly known: 'typed' | 'read'
}

/**
 * An invented job: the voltages around a coil and a resistor in a fan unit, against the current through
 * them. The leads at the capacitor were the other way round, so the sum takes it away.
 */
export const jobPhasors: readonly JobPhasor[] = [
  { label: 'I', quantity: 'current', magnitude: '1.25', angle: '0', known: 'typed' },
  { label: 'VR', quantity: 'voltage', magnitude: '30.0', angle: '0', known: 'typed' },
  { label: 'Vcoil', quantity: 'voltage', magnitude: '52.4', angle: '78', known: 'read' },
  { label: 'Vcap', quantity: 'voltage', magnitude: '24.0', angle: '90', known: 'typed' },
  { label: 'VS', quantity: 'voltage', magnitude: '49.0', angle: '33.5', known: 'read' },
]

/** The terms of the job's sum, with their signs. It must equal VS. */
export const jobTerms = [
  { phasor: 'VR', sign: 1 },
  { phasor: 'Vcoil', sign: 1 },
  { phasor: 'Vcap', sign: -1 },
] as const

/** What the sum comes to, by plain trigonometry: none of the program's own arithmetic. */
export function jobResultant(): { readonly magnitude: number; readonly angle: number } {
  let re = 0
  let im = 0
  for (const { phasor, sign } of jobTerms) {
    const row = jobPhasors.find(({ label }) => label === phasor)
    if (!row) throw new Error(`The job has no ${phasor}.`)
    const radians = (Number(row.angle) * Math.PI) / 180
    re += sign * Number(row.magnitude) * Math.cos(radians)
    im += sign * Number(row.magnitude) * Math.sin(radians)
  }
  return { magnitude: Math.hypot(re, im), angle: (Math.atan2(im, re) * 180) / Math.PI }
}
