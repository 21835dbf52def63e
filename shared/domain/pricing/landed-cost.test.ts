import { describe, expect, it } from 'vitest'
import { landedCentsEach } from '@/shared/domain/pricing/landed-cost'

describe('landed cost per live animal', () => {
  it('shares box and freight among the fish', () => {
    expect(landedCentsEach(11_390, 60)).toBe(190)
    expect(landedCentsEach(5000 + 8900, 25)).toBe(556)
  })

  it('is not known for no animals', () => expect(landedCentsEach(11_390, 0)).toBeNull())
})
