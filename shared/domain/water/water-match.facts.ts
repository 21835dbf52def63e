import type { SourceKey } from '@/shared/sources'

interface Limit {
  value: number
  sourceKey: SourceKey
}

const limit = (value: number, sourceKey: SourceKey): Limit => ({ value, sourceKey })

/**
 * How far the water of a tank may differ from the water the animals come out of. Nobody has published one scheme for
 * all of it: where a figure is ours, its source says so.
 */
export const waterMatch = {
  /** °C apart up to which they may be let go at once. */
  releaseC: limit(2, 'house-rule'),
  /** °C apart from which tempering is needed: the cold end of 5 to 7 °F. */
  temperFromC: limit(2.8, 'lsu-cocahoe'),
  /** °C apart up to which floating the closed bag is enough, and for how long. */
  floatC: limit(5, 'house-rule'),
  floatMinutes: limit(20, 'house-rule'),
  /** °C an hour beyond that. */
  ratePerHourC: limit(5, 'house-rule'),
  /** °C apart beyond which one's own water is brought nearer first. */
  mostC: limit(10, 'house-rule'),
  /** Hours in a closed bag beyond which slow mixing does harm: sellers disagree, this is ours. */
  sealedHours: limit(6, 'house-rule'),
  /** pH apart up to which they may be let go. */
  releasePH: limit(0.5, 'house-rule'),
  /** pH in a quarter of an hour beyond that. */
  stepPH: limit(0.3, 'house-rule'),
  stepMinutes: limit(15, 'house-rule'),
  /** pH apart beyond which one's own water is brought nearer first. */
  mostPH: limit(1.5, 'house-rule'),
  /** Carbonate hardness, ppm as CaCO3: below it the pH of a tank may swing. */
  leastKhPpm: limit(60, 'house-rule'),
  /** ppm apart up to which nothing need be done. */
  releaseKhPpm: limit(100, 'house-rule'),
} as const satisfies Record<string, Limit>
