import type { Equation } from '@/shared/domain/equation'

export const boxEquation: Equation = {
  text: 'U = 1/(1/8 + d/k + 1/8); UA = U · √(Ai · Ao); τ = m · 4186/UA; rests at Ta + P/UA',
  validFor: 'still air, water and box as one lump; k 0.038 W/m·K for dry foam, 0.045 in a wet, bag-lined box',
  sourceKeys: ['piper-1982', 'memory', 'house-rule'],
}

/** Film of still air on either side of a wall, W/m²·K (from memory). */
const STILL_AIR_W_PER_M2K = 8
const WATER_J_PER_L_K = 4186

export interface Box {
  /** Inside. */
  lengthCm: number
  widthCm: number
  heightCm: number
  wallMm: number
  conductivityWPerMK: number
}

/** Heat that passes the walls, W per K between water and air. null for a measure not above zero. */
export function boxLossWPerK(box: Box): number | null {
  const { lengthCm, widthCm, heightCm, wallMm, conductivityWPerMK } = box
  const measures = [lengthCm, widthCm, heightCm, wallMm, conductivityWPerMK]
  if (!measures.every((measure) => measure > 0 && Number.isFinite(measure))) return null
  const wallM = wallMm / 1000
  const perM2 = 1 / (1 / STILL_AIR_W_PER_M2K + wallM / conductivityWPerMK + 1 / STILL_AIR_W_PER_M2K)
  return perM2 * Math.sqrt(surfaceM2(box, 0) * surfaceM2(box, wallM))
}

function surfaceM2({ lengthCm, widthCm, heightCm }: Box, wallM: number): number {
  const outer = (cm: number) => cm / 100 + 2 * wallM
  const [length, width, height] = [outer(lengthCm), outer(widthCm), outer(heightCm)]
  return 2 * (length * width + length * height + width * height)
}

/** Hours in which the difference to the air falls to 37 %, by litres of water and W per K. */
export function boxTimeConstantH(waterL: number, lossWPerK: number): number {
  return (waterL * WATER_J_PER_L_K) / lossWPerK / 3600
}

/** °C after `hours` of steady air and steady heat; exact for the lumped model, so steps of any length agree. */
export function boxStepC(
  startC: number,
  {
    airC,
    heatW,
    waterL,
    lossWPerK,
    hours,
  }: { airC: number; heatW: number; waterL: number; lossWPerK: number; hours: number },
): number {
  const restC = airC + heatW / lossWPerK
  return restC + (startC - restC) * Math.exp(-hours / boxTimeConstantH(waterL, lossWPerK))
}
