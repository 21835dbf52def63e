import { gPerLFromPoundsPerGal } from '@/shared/units/load'
import { piperCatfishFactor, piperLinearFactor } from '@/shared/domain/transport/warmth-of-load'
import type { SourceKey } from '@/shared/sources'

export const haulingSource: SourceKey = 'piper-1982'

/** Market catfish (16 in) in a tank with oxygen, g per L: 4 lb/gal at 65 °F, 25 % per 10 °F. 0 where nothing is left. */
export function catfishHaulGPerL(waterF: number): number {
  return gPerLFromPoundsPerGal(4) * piperCatfishFactor(waterF)
}

/** A tank's load known at one temperature, at another: ±5.56 % of the known load per °F. 0 where nothing is left. */
export function haulAtF(load: number, knownF: number, waterF: number): number {
  return load * piperLinearFactor(65 + waterF - knownF)
}
