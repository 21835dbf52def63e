import type { Weather } from '@/shared/domain/transport/leg-air'
import type { Reason } from '@/shared/domain/transport/verdict'

export interface WorstAir {
  side: 'cold' | 'hot'
  end: 'origin' | 'destination'
  /** Outdoor air of the day the trip is judged by, °C. */
  airC: number
}

const coldCodes = new Set<string>(['too-cold', 'nearly-too-cold', 'freezes', 'air-too-cold'])
const hotCodes = new Set<string>(['too-warm', 'nearly-too-warm', 'air-too-warm'])

/** The air that makes a way unsafe. null: it is not the weather (too many in a bag, an animal nobody knows). */
export function worstAir(weather: Weather, reasons: readonly Reason[]): WorstAir | null {
  const { origin, destination } = weather
  const first = reasons.find(({ code }) => coldCodes.has(code) || hotCodes.has(code))
  if (!first) return null
  if (coldCodes.has(first.code)) {
    const end = origin.cold.minC <= destination.cold.minC ? 'origin' : 'destination'
    return { side: 'cold', end, airC: weather[end].cold.minC }
  }
  const end = origin.hot.maxC >= destination.hot.maxC ? 'origin' : 'destination'
  return { side: 'hot', end, airC: weather[end].hot.maxC }
}
