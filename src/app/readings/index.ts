import { lazy } from 'react'

export { Direction } from './Direction'

/** What the meters showed. It is fetched once the drawing stands: a first visit begins with that. */
export const Readings = lazy(async () => ({ default: (await import('./Readings')).Readings }))
