import { fahrenheitFromC } from '@/shared/units/temperature'

interface Worst {
  side: 'cold' | 'hot'
  place: string
  airC: number
}

/** The worst air of a way in a sentence, both scales: 'Too cold: -12 °C (10 °F) in Cincinnati, OH.' */
export function worstWords({ side, place, airC }: Worst): string {
  const scales = `${Math.round(airC)} °C (${Math.round(fahrenheitFromC(airC))} °F)`
  return `Too ${side}: ${scales} in ${place}.`
}
