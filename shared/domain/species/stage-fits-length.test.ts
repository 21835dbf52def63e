import { describe, expect, it } from 'vitest'
import { stageFitsLength } from '@/shared/domain/species/stage-fits-length'
import { stages } from '@/shared/domain/species/stages.facts'

describe('stage words against inches', () => {
  it.each([
    { stage: 'fry', minIn: 0.5, maxIn: 1, fits: true },
    { stage: 'fingerling', minIn: 0.5, maxIn: 0.5, fits: false },
    { stage: 'fingerling', minIn: 0.75, maxIn: 1, fits: true },
    { stage: 'fingerling', minIn: 3, maxIn: 4.25, fits: true },
    { stage: 'fingerling', minIn: 3, maxIn: 5, fits: false },
    { stage: 'advanced-fingerling', minIn: 4, maxIn: 6, fits: true },
    { stage: 'juvenile', minIn: 2, maxIn: 12, fits: true },
    { stage: 'adult', minIn: 1, maxIn: 2, fits: null },
  ] as const)('$stage of $minIn to $maxIn in: $fits', ({ stage, minIn, maxIn, fits }) => {
    expect(stageFitsLength(stage, minIn, maxIn)).toBe(fits)
  })

  it('never runs backwards', () => {
    for (const { fromIn, toIn } of stages)
      if (fromIn !== null && toIn !== null) expect(fromIn).toBeLessThan(toIn)
  })
})
