import { describe, expect, it } from 'vitest'
import { stageFitsLength } from '@/shared/domain/species/stage-fits-length'
import { stages } from '@/shared/domain/species/stages.facts'

describe('stage words against inches', () => {
  it.each([
    ['fry', 0.5, 1, true],
    ['fingerling', 0.5, 0.5, false],
    ['fingerling', 0.75, 1, true],
    ['fingerling', 3, 4.25, true],
    ['fingerling', 3, 5, false],
    ['advanced-fingerling', 4, 6, true],
    ['juvenile', 2, 12, true],
    ['adult', 1, 2, null],
  ] as const)('%s of %d-%d in: %s', (stage, minIn, maxIn, fits) => {
    expect(stageFitsLength(stage, minIn, maxIn)).toBe(fits)
  })

  it('never runs backwards', () => {
    for (const { fromIn, toIn } of stages)
      if (fromIn !== null && toIn !== null) expect(fromIn).toBeLessThan(toIn)
  })
})
