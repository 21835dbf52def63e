import { describe, expect, it } from 'vitest'

import { checkTrip } from '@/shared/domain/transport/check-trip'
import { usualBags, usualBoxes } from '@/shared/domain/transport/packing.facts'
import { planPacking, type PackingTask } from '@/shared/domain/transport/plan-packing'
import { animals, bags, tripOf } from '@/shared/domain/transport/trips-for-tests'

function taskOf(changes: Partial<PackingTask> = {}): PackingTask {
  const { container: _, ...trip } = tripOf({
    animals: animals('nile_tilapia', { count: 100, massG: 1, fastedHours: 24 }),
  })
  const water = { startC: 25, alkalinityMeqPerL: 2, pH: 7.5 }
  return {
    ...trip,
    water,
    legs: [{ hours: 24, airC: 12 }],
    standsStill: true,
    boxSizes: usualBoxes,
    bagSizes: usualBags,
    ...changes,
  }
}

describe('the packing plan', () => {
  it('is safe, holds every animal and warms them on a cold day', () => {
    const { plan } = planPacking(taskOf())
    expect(plan?.answer.verdict).toBe('safe')
    expect(plan?.packs.heat).not.toBeNull()
    expect((plan?.boxes ?? 0) * (plan?.bagsPerBox ?? 0) * (plan?.animalsPerBag ?? 0)).toBeGreaterThanOrEqual(
      100,
    )
    expect(plan?.priceCents).toBe((plan?.boxes ?? 0) * (plan?.centsPerBox ?? 0))
  })

  it('costs no more in mild air than in cold, and no less for more animals', () => {
    const cents = (changes: Partial<PackingTask>) => planPacking(taskOf(changes)).plan?.priceCents ?? Infinity
    const mild = cents({ legs: [{ hours: 24, airC: 25 }] })
    expect(mild).toBeLessThan(cents({}))
    const many = animals('nile_tilapia', { count: 400, massG: 1, fastedHours: 24 })
    expect(cents({ legs: [{ hours: 24, airC: 25 }], animals: many })).toBeGreaterThan(mild)
  })

  it('has nothing cheaper that is safe with one box fewer', () => {
    const task = taskOf({ animals: animals('nile_tilapia', { count: 300, massG: 1, fastedHours: 24 }) })
    const { plan } = planPacking(task)
    if (!plan || plan.boxes < 2) throw new Error('the task should need several boxes')
    const fewer = bags({
      boxes: plan.boxes - 1,
      bagsPerBox: plan.bagsPerBox,
      waterLPerBag: plan.bag.waterL,
      oxygenLPerBag: plan.bag.oxygenL,
      standsStill: true,
      box: plan.box.box,
      packs: plan.packs,
    })
    expect(checkTrip({ ...task, container: fewer }).verdict).not.toBe('safe')
  })

  it('says why where no packing is safe', () => {
    const frost = planPacking(taskOf({ legs: [{ hours: 40, airC: -30 }] }))
    expect(frost).toMatchObject({ plan: null })
    expect('because' in frost && frost.because.map(({ code }) => code)).toContain('too-cold')
    const long = planPacking(taskOf({ legs: [{ hours: 60, airC: 25 }] }))
    expect('because' in long && long.because.map(({ code }) => code)).toContain('longer-than-table')
  })
})
