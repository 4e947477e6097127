import { lazy } from 'react'
import { Folded } from '../shell/Folded'

const FindingFields = lazy(async () => ({
  default: (await import('./FindingFields')).FindingFields,
}))

/** What the job had to show, and what came of it. */
export function Findings() {
  return (
    <Folded heading="Criterion and conclusion">
      <FindingFields />
    </Folded>
  )
}
