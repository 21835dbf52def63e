import { figures, type Figure } from '@/components/forms/figure'

/** The fields of a batch that hold a figure; rows of a list are named without their number. */
export const batchFigures: Readonly<Record<string, Figure>> = {
  sizeLoMm: figures.batchLengthMm,
  sizeHiMm: figures.batchLengthMm,
  countOnHand: figures.count,
  minOrder: figures.count,
  orderStep: figures.count,
  mostPerBuyer: figures.count,
  'tiers.fromCount': figures.count,
  'tiers.unitCents': figures.cents,
  overcountPct: figures.percent,
  sexClaimPct: figures.percent,
  'water.temperatureC': figures.temperatureC,
  'water.pH': figures.pH,
  'water.ghPpm': figures.ppm,
  'water.khPpm': figures.ppm,
  'water.saltPpt': figures.saltPpt,
  'windows.capacity': figures.count,
  'shipping.boxCents': figures.cents,
  'shipping.freightCents': figures.cents,
  'shipping.mostInBox': figures.count,
  depositPct: figures.percent,
  freeCancelHours: figures.hours,
  'promise.windowHours': figures.hours,
  'promise.survivalDays': figures.count,
}
