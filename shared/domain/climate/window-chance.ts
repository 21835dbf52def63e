import type { SourceKey } from '@/shared/sources'

/** Cold days come together: each further night counts for 0.6 of one. Measured on NOAA daily records. */
const FURTHER_NIGHT = 0.6
export const windowChanceSource: SourceKey = 'arguez-2012'

const exponent = (nights: number) => 1 + FURTHER_NIGHT * (Math.max(1, nights) - 1)

/** Chance that some night of `nights` falls below what one night falls below by `chance`. */
export function chanceOfSomeNight(chance: number, nights: number): number {
  return 1 - (1 - chance) ** exponent(nights)
}

/** The other way: chance of one night that leaves this chance for the whole window. */
export function chanceOfOneNight(windowChance: number, nights: number): number {
  return 1 - (1 - windowChance) ** (1 / exponent(nights))
}
