import { describe, expect, it } from 'vitest'

import { riskOfFlags } from '@/shared/domain/listings/flag-weights'

describe('the risk of a listing version', () => {
  it('puts a blocked animal in the words before a new seller with a telephone number', () => {
    const named = riskOfFlags(['new', 'names-blocked:striped_snakehead'])
    const phoned = riskOfFlags(['new', 'first-listing', 'contact:phone'])
    const plain = riskOfFlags(['new'])
    expect(named).toBeGreaterThan(phoned)
    expect(phoned).toBeGreaterThan(plain)
    expect(plain).toBeGreaterThan(0)
  })

  it('counts each sign, and knows nothing of others', () => {
    expect(riskOfFlags(['contact:phone', 'contact:mail'])).toBe(2 * riskOfFlags(['contact:phone']))
    expect(riskOfFlags([])).toBe(0)
    expect(riskOfFlags(['constructor', 'unheard-of'])).toBe(0)
  })
})
