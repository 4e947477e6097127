import { lazy } from 'react'

/** The circuit behind the readings. It is fetched once the drawing stands. */
export const Circuit = lazy(async () => ({ default: (await import('./Circuit')).Circuit }))
