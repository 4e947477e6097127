import type { Quantity } from '../../sheet'

/** The quantities in the order in which scale bars and descriptions name them. */
export const QUANTITIES: readonly Quantity[] = ['voltage', 'current', 'impedance', 'power', 'other']
