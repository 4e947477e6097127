import { describe, expect, it } from 'vitest'
import { type Quantity, unitOf } from '../../src/core'

describe('units', () => {
  it('follow from the quantity', () => {
    const quantities: readonly Quantity[] = ['voltage', 'current', 'impedance', 'power', 'other']
    expect(quantities.map(unitOf)).toEqual(['V', 'A', 'Ω', 'VA', ''])
  })
})
