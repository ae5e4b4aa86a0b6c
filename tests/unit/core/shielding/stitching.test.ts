import { describe, expect, it } from 'vitest'

import { findMethod } from '@/lib/core/method/registry'

function resultsOf(raw: Readonly<Record<string, string>>): Readonly<Record<string, number>> {
  const run = findMethod('stitching-distance')?.run(raw)
  if (!run?.ok) throw new Error('A run was expected')
  return Object.fromEntries(run.value.outcome.results.map(({ key, value }) => [key, value]))
}

describe('stitching vias', () => {
  // λ/20 at 1 GHz in ε = 4 is 299792458/(1e9·2·20) = 7.4948 mm.
  it('number one more than the gaps of an open line, and as many as the gaps of a closed one', () => {
    const results = resultsOf({ frequency: '1 GHz', permittivity: '4', length: '30 mm' })
    expect(results['distance']).toBeCloseTo(7.494811e-3, 8)
    expect(results).toMatchObject({ count: 6, closedCount: 5 })
  })

  it('need none more where the length is a whole number of distances', () => {
    const results = resultsOf({ frequency: '299.792458 MHz', permittivity: '1', length: '500 mm' })
    expect(results).toMatchObject({ count: 11, closedCount: 10 })
  })

  it('have no number without a length', () => {
    expect(resultsOf({ frequency: '1 GHz', permittivity: '4' })).not.toHaveProperty('count')
  })
})
