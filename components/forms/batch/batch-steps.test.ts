import { describe, expect, it } from 'vitest'

import { batchDefaults } from './batch-defaults'
import { batchSteps, checkStep, stepOfField } from './batch-steps'

describe('the steps of the batch form', () => {
  it('asks for every field in exactly one step', () => {
    const asked = batchSteps.flatMap((step) => step.fields)
    expect([...asked].sort()).toEqual(Object.keys(batchDefaults({ ownState: '', licenceNumbers: '' })).sort())
  })

  it('finds the step of a field deep in a list', () => {
    expect(batchSteps[stepOfField('tiers.1.unitCents')]?.id).toBe('count-price')
    expect(stepOfField('somethingElse')).toBe(checkStep)
  })
})
