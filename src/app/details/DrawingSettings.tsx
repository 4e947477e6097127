import { lazy } from 'react'
import { Folded } from '../shell/Folded'

const DrawingFields = lazy(async () => ({
  default: (await import('./DrawingFields')).DrawingFields,
}))

/** The paper, the scales and the reference: chosen here, or left to the page. */
export function DrawingSettings() {
  return (
    <Folded heading="Paper, scale and reference">
      <DrawingFields />
    </Folded>
  )
}
