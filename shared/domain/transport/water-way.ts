import { boxStepC } from '@/shared/domain/transport/box'
import { legAirC, type Leg, type Weather } from '@/shared/domain/transport/leg-air'
import { coldOfPacksW, coldStoreKj, heatOfPacksW, type Packs } from '@/shared/domain/transport/pack-heat'

export const STEP_H = 0.25

export interface WarmthStep {
  hour: number
  airC: number
  waterC: number
}

export interface Warmth {
  startC: number
  waterL: number
  lossWPerK: number
  packs: Packs
  legs: readonly Leg[]
  departHour: number
  weather: Weather | null
  side: 'cold' | 'hot'
}

/**
 * Temperature of the water every 15 minutes of the way, first at packing; a leg's last step is shorter where the hours
 * ask for it. Stops at 0 °C, where the lump would turn to ice. null: the air of a leg is not known.
 */
export function waterOnTheWay(warmth: Warmth): WarmthStep[] | null {
  const { startC, packs, legs, departHour, weather, side } = warmth
  const steps: WarmthStep[] = []
  let [hour, waterC, coldKj] = [0, startC, coldStoreKj(packs)]
  for (const leg of legs) {
    for (let gone = 0; gone < leg.hours - 1e-9;) {
      const hours = Math.min(STEP_H, leg.hours - gone)
      const airC = legAirC(leg, { weather, side, hour: departHour + hour + hours / 2 })
      if (airC === null) return null
      if (steps.length === 0) steps.push({ hour: 0, airC, waterC })
      const coldW = coldKj > 0 ? coldOfPacksW(packs, waterC) : 0
      coldKj -= coldW * hours * 3.6
      const heatW = heatOfPacksW(packs, hour + hours / 2, startC) - coldW
      waterC = boxStepC(waterC, { airC, heatW, waterL: warmth.waterL, lossWPerK: warmth.lossWPerK, hours })
      gone += hours
      hour += hours
      steps.push({ hour, airC, waterC: Math.max(0, waterC) })
      if (waterC <= 0) return steps
    }
  }
  return steps
}
