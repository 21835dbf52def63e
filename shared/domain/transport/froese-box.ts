import type { Equation } from '@/shared/domain/equation'

export const froeseBoxEquation: Equation = {
  text: 'T = Ta + (T0 − Ta) · exp(−t · 0.11 · Ws / Wv); Ws = 2LW + 2V/W + 2V/L, cm, mL, hours',
  validFor: 'measured on foam boxes of 2.5 cm wall and about 8 L of water, steady air',
  sourceKeys: ['froese-1998'],
}

/** Measured coefficient of 2.5 cm foam, cm per hour. */
const INSULATION_CM_PER_H = 0.11

interface FoamBox {
  /** Inside, and the water that stands in it. */
  lengthCm: number
  widthCm: number
  volumeMl: number
}

/** Surface of the water in the box, cm². */
export function wettedSurfaceCm2({ lengthCm, widthCm, volumeMl }: FoamBox): number {
  return 2 * lengthCm * widthCm + (2 * volumeMl) / widthCm + (2 * volumeMl) / lengthCm
}

/** Share of the difference to the air that is lost per hour. null for a measure not above zero. */
export function froeseRatePerHour(box: FoamBox): number | null {
  if (!(box.lengthCm > 0 && box.widthCm > 0 && box.volumeMl > 0)) return null
  return (INSULATION_CM_PER_H * wettedSurfaceCm2(box)) / box.volumeMl
}

interface Standing {
  box: FoamBox
  startC: number
  airC: number
  hours: number
}

/** Water of a foam box after standing in steady air, °C: Froese 1998. null out of range or when the water would freeze. */
export function froeseWaterC({ box, startC, airC, hours }: Standing): number | null {
  const rate = froeseRatePerHour(box)
  if (
    rate === null ||
    !(startC >= 0 && startC <= 45 && airC >= -40 && airC <= 60 && hours >= 0 && hours <= 96)
  ) {
    return null
  }
  const waterC = airC + (startC - airC) * Math.exp(-hours * rate)
  return waterC >= 0 ? waterC : null
}

/** Hours until the water of a foam box passes `limitC` on its way to the air. null: it never does. */
export function froeseHoursTo(standing: Omit<Standing, 'hours'>, limitC: number): number | null {
  const rate = froeseRatePerHour(standing.box)
  const share = (limitC - standing.airC) / (standing.startC - standing.airC)
  return rate !== null && share > 0 && share <= 1 ? -Math.log(share) / rate : null
}
