import type { Section } from '../section'
import { cautions } from './cautions'
import { comparison } from './comparison'
import { conclusion } from './conclusion'
import { corrections } from './corrections'
import { elements } from './elements'
import { hand } from './hand'
import { hazards } from './hazards'
import { instruments } from './instruments'
import { job } from './job'
import { link } from './link'
import { power } from './power'
import { readings } from './readings'
import { schedule } from './schedule'
import { signOff } from './sign-off'
import { sums } from './sums'
import { verdict } from './verdict'

/** The sections of a report, in their order. */
export const SECTIONS: readonly Section[] = [
  job,
  hazards,
  verdict,
  sums,
  schedule,
  readings,
  instruments,
  hand,
  comparison,
  elements,
  power,
  corrections,
  cautions,
  conclusion,
  signOff,
  link,
]
