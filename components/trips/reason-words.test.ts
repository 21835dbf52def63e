import { expect, it } from 'vitest'

import { reasonFigures } from './reason-words'

import type { Reason } from '@/shared/domain/transport/verdict'

const reason = (change: Partial<Reason>): Reason => ({
  code: 'too-cold',
  verdict: 'unsafe',
  value: null,
  limit: null,
  atHour: null,
  sourceKey: 'house-rule',
  ...change,
})

it('says the figure, its limit and when, in both units where lives hang on it', () => {
  expect(reasonFigures(reason({ value: 8, limit: 10, atHour: 1.5 }), 'us')).toBe(
    'here 46 °F (8 °C), the limit is 50 °F (10 °C), after 1.5 h',
  )
  expect(reasonFigures(reason({ code: 'vessel-too-full', value: 61.23, limit: 60 }), 'us')).toBe(
    'here 61.2 g/L, the limit is 60 g/L',
  )
  expect(reasonFigures(reason({ code: 'needs-water' }), 'metric')).toBe('')
})
