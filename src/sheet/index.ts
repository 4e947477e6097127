export type * from './evaluation'
export type * from './types'
