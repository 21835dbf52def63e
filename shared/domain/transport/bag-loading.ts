import { bagTable, bagTableHours, type BagStage } from '@/shared/domain/transport/bag-loading.facts'
import { warmthOfLoad } from '@/shared/domain/transport/warmth-of-load'
import { gPerLFromPoundsPerGal } from '@/shared/units/load'

interface BagTrip {
  stage: BagStage
  hours: number
  waterF: number
}

/**
 * Animals a bag with oxygen may hold, g per L of water: low end of the table, straight between its columns, times the
 * cautious warmth factor. null for less than 1 hour, more than 48, or outside 32-100 °F.
 */
export function bagLoadGPerL({ stage, hours, waterF }: BagTrip): number | null {
  const warmth = warmthOfLoad(waterF)
  const poundsPerGal = between(bagTable[stage].low, hours)
  return warmth === null || poundsPerGal === null ? null : gPerLFromPoundsPerGal(poundsPerGal) * warmth
}

function between(loads: readonly number[], hours: number): number | null {
  const after = bagTableHours.findIndex((column) => column >= hours)
  const [to, load] = [bagTableHours[after], loads[after]]
  if (to === undefined || load === undefined || !(hours >= 1)) return null
  const [from, before] = [bagTableHours[after - 1], loads[after - 1]]
  if (from === undefined || before === undefined) return load
  return before + ((load - before) * (hours - from)) / (to - from)
}
