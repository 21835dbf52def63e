import type { TripStep } from '@/shared/domain/transport/trip'
import type { WarmthStep } from '@/shared/domain/transport/water-way'

type Figures = Omit<TripStep, keyof WarmthStep>

const none: Figures = { oxygenMgPerL: null, co2MgPerL: null, tanMgPerL: null, nh3NMgPerL: null }

/** A moment of the way with its water figures. Written out: spreading two objects a step was half of a trip's time. */
export function stepOf({ hour, airC, waterC }: WarmthStep, figures: Figures = none): TripStep {
  const { oxygenMgPerL, co2MgPerL, tanMgPerL, nh3NMgPerL } = figures
  return { hour, airC, waterC, oxygenMgPerL, co2MgPerL, tanMgPerL, nh3NMgPerL }
}
