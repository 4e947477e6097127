import { lazy } from 'react'
import { Folded } from '../shell/Folded'

const TitleFields = lazy(async () => ({ default: (await import('./TitleFields')).TitleFields }))

/** What the title block of the sheet says. */
export function TitleBlock() {
  return (
    <Folded heading="Title block">
      <TitleFields />
    </Folded>
  )
}
