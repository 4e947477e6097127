import { lazy } from 'react'
import { Folded } from '../shell/Folded'

const Hazards = lazy(async () => ({ default: (await import('./Hazards')).Hazards }))

/** The hazards of the job, to be recorded before anything is measured. */
export function BeforeMeasuring() {
  return (
    <Folded heading="Before you measure">
      <Hazards />
    </Folded>
  )
}
