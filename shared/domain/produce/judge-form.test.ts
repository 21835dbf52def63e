import { describe, expect, it } from 'vitest'

import { judgeForm, produceCaution } from '@/shared/domain/produce/judge-form'

describe('the form of a harvest', () => {
  it('lets whole produce through', () => expect(judgeForm('whole', false).effect).toBe('allowed'))

  it('lets leaves cut at the harvest through with words on the bag', () =>
    expect(judgeForm('harvest-cut', false)).toEqual({
      effect: 'allowed-with-label',
      label: 'Wash before eating.',
      saying: null,
    }))

  it('holds cut, mixed or washed greens until a licence is accepted, and says why', () => {
    const held = judgeForm('cut-mixed-or-washed', false)
    expect(held.effect).toBe('held')
    expect(held.saying).toContain('licence')
    const licensed = judgeForm('cut-mixed-or-washed', true)
    expect([licensed.effect, licensed.label]).toEqual([
      'allowed-with-label',
      'Keep at 41 °F (5 °C) or colder.',
    ])
  })

  it('tells every buyer to wash it', () => expect(produceCaution).toMatch(/^Wash before eating/))
})
