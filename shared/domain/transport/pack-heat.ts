import { coldPacks, heatPacks, type ColdPackId, type HeatPackId } from '@/shared/domain/transport/packs.facts'

export interface Packs {
  heat: { id: HeatPackId; count: number } | null
  cold: { id: ColdPackId; count: number } | null
  /** Heat packs burn air. */
  hasAirHoles: boolean
}

// House rules: an hour to warm up, two when packed below 10 °C; full strength for four fifths of the printed hours, then
// fading evenly to nothing.
const WARM_UP_H = 1
const COLD_WARM_UP_H = 2
const COLD_START_C = 10
const FULL_SHARE = 0.8
const MELTING_KJ_PER_KG = 334
/** House rule: what passes from the water through bag and wrapping into one melting pack, W per K. */
const INTO_COLD_PACK_W_PER_K = 0.6

/** Heat of all heat packs, W, `hour` hours after they were opened into a box of this air. */
export function heatOfPacksW({ heat, hasAirHoles }: Packs, hour: number, packedC: number): number {
  if (!heat || !hasAirHoles) return 0
  const { ratedHours, watts } = heatPacks[heat.id]
  const warmUpH = packedC < COLD_START_C ? COLD_WARM_UP_H : WARM_UP_H
  const rising = Math.min(1, hour / warmUpH)
  const fading = Math.min(1, Math.max(0, (ratedHours - hour) / (ratedHours * (1 - FULL_SHARE))))
  return heat.count * watts * Math.min(rising, fading)
}

/** What the frozen packs can still take up, kJ, before any has melted. */
export function coldStoreKj({ cold }: Packs): number {
  return cold ? cold.count * coldPacks[cold.id].kg * MELTING_KJ_PER_KG : 0
}

/** What passes into the frozen packs, W, from water of this temperature. */
export function coldOfPacksW({ cold }: Packs, waterC: number): number {
  return cold ? cold.count * INTO_COLD_PACK_W_PER_K * Math.max(0, waterC) : 0
}
