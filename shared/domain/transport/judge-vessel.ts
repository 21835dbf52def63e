import { packedOxygenDemandMgPerKgHour } from '@/shared/domain/animals/packed-oxygen-demand'
import { CO2_PER_OXYGEN_G, TAN_PER_OXYGEN_G } from '@/shared/domain/transport/bag-equations.facts'
import { judgeAmmonia } from '@/shared/domain/transport/judge-ammonia'
import { stepOf } from '@/shared/domain/transport/step-of'
import type { Animals, SourceWater, TripStep, Vessel } from '@/shared/domain/transport/trip'
import type { Reason } from '@/shared/domain/transport/verdict'
import { warmthOfLoad } from '@/shared/domain/transport/warmth-of-load'
import type { WarmthStep } from '@/shared/domain/transport/water-way'
import { ammoniaFraction } from '@/shared/domain/water/ammonia-fraction'
import { oxygenSaturationMgPerL } from '@/shared/domain/water/oxygen-saturation'
import { fahrenheitFromC } from '@/shared/units/temperature'

/** g per L at 65 °F: bait fish at a gallon a pound with oxygen (LSU AgCenter), half of it with air (house rule). */
const aeratedGPerL = { air: 60, oxygen: 120 } as const
/** Water is counted as full to nine tenths when the animals come in: house rule. */
const START_SHARE = 0.9
const CO2_BURDEN_MG_PER_L = 20
const CHANGE_WATER_H = 16

interface Ride {
  animals: Animals
  water: SourceWater
  vessel: Vessel
}

const whole = { atHour: null }

/** Water of a bucket, cooler or tank along the way and everything that speaks against it. */
export function judgeVessel(
  ride: Ride,
  way: readonly WarmthStep[],
): { steps: TripStep[]; reasons: Reason[] } {
  const { animals, water, vessel } = ride
  const { species, massG } = animals
  const model = species.oxygenModel
  const kg = (animals.count * massG) / 1000
  const startOxygen =
    START_SHARE * (oxygenSaturationMgPerL({ waterC: water.startC, pressureMmHg: 760, salinityPpt: 0 }) ?? NaN)
  let [usedMgPerL, countedC, before, mostNh3] = [0, way[0]?.waterC ?? NaN, 0, 0]
  const steps = way.map((step): TripStep => {
    countedC = Math.max(countedC, step.waterC)
    const demand = model && packedOxygenDemandMgPerKgHour({ model, massG, waterC: countedC })
    usedMgPerL = demand ? usedMgPerL + (demand * kg * (step.hour - before)) / vessel.waterL : NaN
    before = step.hour
    const tan = usedMgPerL * TAN_PER_OXYGEN_G
    // The pH of the source stays counted: air and splashing drive off the CO2 that would lower it.
    const nh3 = tan * (ammoniaFraction({ waterC: countedC, pH: water.pH }) ?? NaN)
    mostNh3 = Math.max(mostNh3, nh3)
    const isOpen = vessel.aeration === 'none'
    return stepOf(step, {
      oxygenMgPerL: isOpen ? finite(Math.max(0, startOxygen - usedMgPerL)) : null,
      co2MgPerL: isOpen ? finite(usedMgPerL * CO2_PER_OXYGEN_G) : null,
      tanMgPerL: finite(tan),
      nh3NMgPerL: finite(nh3),
    })
  })
  if (!Number.isFinite(usedMgPerL) || !Number.isFinite(mostNh3))
    return { steps, reasons: [unknownOf(animals)] }
  const reasons = [...judgeAmmonia(species, mostNh3), ...judgeHours(vessel, way)]
  const air =
    vessel.aeration === 'none' ? judgeStanding(ride, steps) : judgeAerated(ride, vessel.aeration, countedC)
  return { steps, reasons: [...reasons, ...air] }
}

const finite = (value: number) => (Number.isFinite(value) ? value : null)

function unknownOf({ species, massG }: Animals): Reason {
  const code = species.oxygenModel === null ? 'no-oxygen-model' : 'too-small-for-model'
  return { code, verdict: 'unknown', value: massG, limit: null, sourceKey: 'fb4-2017', ...whole }
}

function judgeHours({ aeration }: Vessel, way: readonly WarmthStep[]): Reason[] {
  const hours = way.at(-1)?.hour ?? 0
  if (aeration === 'none' || hours <= CHANGE_WATER_H) return []
  return [
    {
      code: 'change-water',
      verdict: 'caution',
      value: hours,
      limit: CHANGE_WATER_H,
      atHour: CHANGE_WATER_H,
      sourceKey: 'piper-1982',
    },
  ]
}

function judgeStanding({ animals: { species } }: Ride, steps: readonly TripStep[]): Reason[] {
  const { leastOxygenMgPerL: least, goodOxygenMgPerL: good } = species
  const reasons: Reason[] = []
  const below = (limit: number) =>
    steps.find(({ oxygenMgPerL }) => oxygenMgPerL !== null && oxygenMgPerL < limit)
  const [dire, low] = [below(least ?? 0), below(good ?? 0)]
  const sourceKey = 'house-rule'
  if (dire && least !== null) {
    reasons.push({
      code: 'water-short-of-oxygen',
      verdict: 'unsafe',
      value: dire.oxygenMgPerL,
      limit: least,
      atHour: dire.hour,
      sourceKey,
    })
  } else if (low && good !== null) {
    reasons.push({
      code: 'water-low-in-oxygen',
      verdict: 'caution',
      value: low.oxygenMgPerL,
      limit: good,
      atHour: low.hour,
      sourceKey,
    })
  }
  const co2 = steps.find(({ co2MgPerL }) => co2MgPerL !== null && co2MgPerL > CO2_BURDEN_MG_PER_L)
  if (co2) {
    reasons.push({
      code: 'carbon-dioxide-raised',
      verdict: 'caution',
      value: co2.co2MgPerL,
      limit: CO2_BURDEN_MG_PER_L,
      atHour: co2.hour,
      sourceKey: 'wynne-2007',
    })
  }
  return reasons
}

function judgeAerated({ animals, vessel }: Ride, aeration: 'air' | 'oxygen', warmestC: number): Reason[] {
  const value = (animals.count * animals.massG) / vessel.waterL
  const limit = aeratedGPerL[aeration] * (warmthOfLoad(fahrenheitFromC(warmestC)) ?? 0)
  if (value <= limit) return []
  return [{ code: 'vessel-too-full', verdict: 'unsafe', value, limit, sourceKey: 'lsu-cocahoe', ...whole }]
}
