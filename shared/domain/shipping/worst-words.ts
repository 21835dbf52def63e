import { printBothTemperatures } from '@/shared/units/temperature'

interface Worst {
  side: 'cold' | 'hot'
  place: string
  airC: number
}

/** The worst air of a way in a sentence, both scales: 'Too cold: 10 °F (-12 °C) in Cincinnati, OH.' */
export function worstWords({ side, place, airC }: Worst): string {
  return `Too ${side}: ${printBothTemperatures(airC, 'us')} in ${place}.`
}
