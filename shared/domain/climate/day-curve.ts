import type { AirDay } from '@/shared/domain/climate/design-weather'

/** House rule: coldest at 6, warmest at 15, half a cosine between. */
const COLDEST_H = 6
const WARMEST_H = 15

/** Air at an hour of the day (any number of hours; days repeat), °C. */
export function airOfHourC({ minC, maxC }: AirDay, hour: number): number {
  const sinceColdest = (((hour - COLDEST_H) % 24) + 24) % 24
  const rising = WARMEST_H - COLDEST_H
  const turn = sinceColdest < rising ? sinceColdest / rising : 1 - (sinceColdest - rising) / (24 - rising)
  return minC + ((maxC - minC) * (1 - Math.cos(Math.PI * turn))) / 2
}
