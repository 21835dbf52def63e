import { packedOxygenDemandMgPerKgHour } from '@/shared/domain/animals/packed-oxygen-demand'
import { bagChemistry, type BagWater } from '@/shared/domain/transport/bag-chemistry'
import { bagLoadGPerL } from '@/shared/domain/transport/bag-loading'
import { bagTableHours, bagTableSource } from '@/shared/domain/transport/bag-loading.facts'
import { judgeAmmonia } from '@/shared/domain/transport/judge-ammonia'
import { stepOf } from '@/shared/domain/transport/step-of'
import type { Animals, BaggedBoxes, SourceWater, TripStep } from '@/shared/domain/transport/trip'
import type { Reason } from '@/shared/domain/transport/verdict'
import type { OxygenModel } from '@/shared/domain/species/species-record'
import type { WarmthStep } from '@/shared/domain/transport/water-way'
import { fahrenheitFromC } from '@/shared/units/temperature'

/** House rules: a bag that stands still counts half; these much CO2 burden, stun cold-water animals, stun all. */
const STILL_FACTOR = 2
const CO2_RAISED_MG_PER_L = 40
const CO2_COLD_WATER_MG_PER_L = 100
const CO2_ALL_MG_PER_L = 200
const OXYGEN_LOW_SHARE = 2 / 3
const NEARLY_FULL_SHARE = 0.9
const LONGEST_TABLE_H = bagTableHours[bagTableHours.length - 1] ?? NaN

interface Bag {
  animals: Animals
  water: SourceWater
  bags: BaggedBoxes
  /** g of animals in the fullest bag. */
  massG: number
}

/** Water in the fullest bag along the way and everything that speaks against it; the load table and the balance both. */
export function judgeBag(bag: Bag, way: readonly WarmthStep[]): { steps: TripStep[]; reasons: Reason[] } {
  const model = bag.animals.species.oxygenModel
  const table = judgeLoad(bag, way)
  if (model === null) {
    const reason: Reason = {
      code: 'no-oxygen-model',
      verdict: 'unknown',
      value: null,
      limit: null,
      atHour: null,
      sourceKey: 'fb4-2017',
    }
    return { steps: way.map((step) => stepOf(step)), reasons: [...table, reason] }
  }
  const fill = {
    waterL: bag.bags.waterLPerBag,
    oxygenL: bag.bags.oxygenLPerBag,
    alkalinityMeqPerL: bag.water.alkalinityMeqPerL,
  }
  const use = oxygenUse(model, bag)
  let [usedG, before, mostCo2] = [0, 0, 0]
  const steps = way.map((step): TripStep => {
    usedG += use.gramsPerHour(step.waterC) * (step.hour - before)
    before = step.hour
    const now = usedG > 0 ? bagChemistry(fill, usedG, step.waterC) : null
    mostCo2 = Math.max(mostCo2, now?.co2MgPerL ?? 0)
    return now ? stepOf(step, now) : stepOf(step)
  })
  // Ammonia and CO2 only grow on the way, and warmth adds ammonia: the end at the warmest is the worst.
  const end = bagChemistry(fill, usedG, use.countedC())
  const worst = end && { ...end, co2MgPerL: mostCo2 }
  return { steps, reasons: [...table, ...judgeBalance(bag, worst, usedG)] }
}

/** Cooling on the way earns the animals nothing: chilled at once, they are stressed, not rested. NaN: beyond the model. */
function oxygenUse(model: OxygenModel, { animals, massG }: Bag) {
  let [countedC, gramsPerHour] = [-Infinity, NaN]
  return {
    countedC: () => countedC,
    gramsPerHour: (waterC: number) => {
      if (waterC > countedC) {
        countedC = waterC
        const demand = packedOxygenDemandMgPerKgHour({ model, massG: animals.massG, waterC })
        gramsPerHour = demand === null ? NaN : (demand * massG) / 1e6
      }
      return gramsPerHour
    },
  }
}

function judgeLoad({ animals, bags, massG }: Bag, way: readonly WarmthStep[]): Reason[] {
  const hours = way.at(-1)?.hour ?? NaN
  const warmestC = Math.max(...way.map(({ waterC }) => waterC))
  const known = Math.min(LONGEST_TABLE_H, Math.max(1, hours))
  const table = bagLoadGPerL({ stage: animals.stage, hours: known, waterF: fahrenheitFromC(warmestC) })
  const beyond: Reason[] =
    hours > LONGEST_TABLE_H
      ? [
          {
            code: 'longer-than-table',
            verdict: 'unknown',
            value: hours,
            limit: LONGEST_TABLE_H,
            atHour: LONGEST_TABLE_H,
            sourceKey: bagTableSource,
          },
        ]
      : []
  if (table === null) return beyond
  const limit = table / (bags.standsStill ? STILL_FACTOR : 1)
  const value = massG / bags.waterLPerBag
  const common = { value, limit, atHour: null, sourceKey: bagTableSource }
  if (value > limit) return [...beyond, { code: 'bag-too-full', verdict: 'unsafe', ...common }]
  if (value > limit * NEARLY_FULL_SHARE)
    return [...beyond, { code: 'bag-nearly-full', verdict: 'caution', ...common }]
  return beyond
}

function judgeBalance({ animals, bags }: Bag, worst: BagWater | null, usedG: number): Reason[] {
  if (worst === null || !Number.isFinite(usedG)) {
    return [
      {
        code: 'too-small-for-model',
        verdict: 'unknown',
        value: animals.massG,
        limit: null,
        atHour: null,
        sourceKey: 'fb4-2017',
      },
    ]
  }
  const had = worst.oxygenHadG / (bags.standsStill ? STILL_FACTOR : 1)
  const oxygen = { value: usedG, limit: had, atHour: null, sourceKey: 'fb4-2017' } as const
  const co2 = { value: worst.co2MgPerL, atHour: null, sourceKey: 'house-rule' } as const
  const stuns = animals.species.thermalClass === 'cold' ? CO2_COLD_WATER_MG_PER_L : CO2_ALL_MG_PER_L
  const reasons: Reason[] = judgeAmmonia(animals.species, worst.nh3NMgPerL)
  if (usedG > had) reasons.push({ code: 'oxygen-runs-out', verdict: 'unsafe', ...oxygen })
  else if (usedG > had * OXYGEN_LOW_SHARE)
    reasons.push({ code: 'oxygen-runs-low', verdict: 'caution', ...oxygen })
  if (worst.co2MgPerL > stuns)
    reasons.push({ code: 'carbon-dioxide-high', verdict: 'unsafe', limit: stuns, ...co2 })
  else if (worst.co2MgPerL > CO2_RAISED_MG_PER_L) {
    reasons.push({ code: 'carbon-dioxide-raised', verdict: 'caution', limit: CO2_RAISED_MG_PER_L, ...co2 })
  }
  return reasons
}
