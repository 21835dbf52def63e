import { bagTableWaterF } from '@/shared/domain/transport/bag-loading.facts'
import type { Equation } from '@/shared/domain/equation'

export const warmthOfLoadEquation: Equation = {
  text: 'warmer than 65 °F: 1 − 0.0556 per °F, at least 0.25; colder: 1 + 0.025 per °F, at most 1.25',
  validFor:
    'inside the water temperatures the species may travel at; the most careful of three published rules each way',
  sourceKeys: ['piper-1982', 'mx392', 'house-rule'],
}

/** Share of the 65 °F load by Piper's general rule: 5.56 % per °F each way. 0 where nothing is left. */
export function piperLinearFactor(waterF: number): number {
  return Math.max(0, 1 - 0.0556 * (waterF - 65))
}

/** Share of the 65 °F load by Piper's catfish rule: 25 % per 10 °F each way. 0 where nothing is left. */
export function piperCatfishFactor(waterF: number): number {
  return Math.max(0, 1 - 0.025 * (waterF - 65))
}

/** Share of the 65 °F load when oxygen use doubles per 18 °F (10 °C): the hopeful rule when it is warmer. */
export function doublingFactor(waterF: number): number {
  return 2 ** (-(waterF - 65) / 18)
}

/** Share of the 65 °F load that we plan by: never the hopeful rule. null outside 32-100 °F. */
export function warmthOfLoad(waterF: number): number | null {
  if (!(waterF >= 32 && waterF <= 100)) return null
  return waterF > bagTableWaterF
    ? Math.max(0.25, piperLinearFactor(waterF))
    : Math.min(1.25, piperCatfishFactor(waterF))
}
