import { figures, type Figure } from '@/components/forms/figure'
import { readNetWeight } from '@/shared/domain/listings/read-net-weight'
import { parseLengthCm } from '@/shared/units/length'
import { parseMassG, poundsFromG, gramsPerOunce } from '@/shared/units/mass'
import { parseVolumeL, litresPerCubicFoot } from '@/shared/units/volume'
import { parseQuantity } from '@/shared/units/parse-quantity'

const trim = (value: number, decimals: number) => String(Number(value.toFixed(decimals)))

/** Always typed with its unit; a bare figure is asked about. */
const netG: Figure = {
  read: (text) => {
    const read = readNetWeight(text)
    return 'netG' in read ? read.netG : null
  },
  print: (grams, units) => {
    if (units === 'metric') return grams >= 1000 ? `${trim(grams / 1000, 3)} kg` : `${trim(grams, 1)} g`
    const pounds = poundsFromG(grams)
    return pounds >= 1 ? `${trim(pounds, 2)} lb` : `${trim(grams / gramsPerOunce, 1)} oz`
  },
}

/** Loose goods are measured in cubic feet or litres; a bare figure is one of those, never gallons. */
const litres: Figure = {
  read: (text, units) => {
    const quantity = parseQuantity(text)
    if (quantity?.unit === '') return units === 'us' ? quantity.value * litresPerCubicFoot : quantity.value
    return parseVolumeL(text, units)
  },
  print: (litresIn, units) =>
    units === 'us' ? `${trim(litresIn / litresPerCubicFoot, 2)} cu ft` : `${trim(litresIn, 1)} L`,
}

const weightKg: Figure = {
  read: (text, units) => {
    const grams = parseMassG(text, units)
    return grams === null ? null : grams / 1000
  },
  print: (kilograms, units) =>
    units === 'us' ? `${trim(poundsFromG(kilograms * 1000), 1)} lb` : `${trim(kilograms, 2)} kg`,
}

const MM_PER_INCH = 25.4

/** Grain and worms are finer than the quarter inches of fish. */
const lengthMm: Figure = {
  read: (text, units) => {
    if (/mm\s*$/i.test(text)) {
      const quantity = parseQuantity(text)
      return quantity?.unit === 'mm' ? quantity.value : null
    }
    const cm = parseLengthCm(text, units)
    return cm === null ? null : Number((cm * 10).toFixed(2))
  },
  print: (mm, units) => (units === 'us' ? `${trim(mm / MM_PER_INCH, 3)} in` : `${trim(mm, 1)} mm`),
}

/** The fields of worms, media and produce that hold a figure; rows of a list are named without their number. */
export const supplyFigures: Readonly<Record<string, Figure>> = {
  'saleUnit.netG': netG,
  'saleUnit.count': figures.count,
  'saleUnit.litres': litres,
  'saleUnit.weightKg': weightKg,
  sizeLoMm: lengthMm,
  sizeHiMm: lengthMm,
  grainLoMm: lengthMm,
  grainHiMm: lengthMm,
  countOnHand: figures.count,
  minOrder: figures.count,
  orderStep: figures.count,
  mostPerBuyer: figures.count,
  'tiers.fromCount': figures.count,
  'tiers.unitCents': figures.cents,
  overcountPct: figures.percent,
  'handling.heldC': figures.temperatureC,
  'windows.capacity': figures.count,
  depositPct: figures.percent,
  freeCancelHours: figures.hours,
  'promise.windowHours': figures.hours,
  'promise.survivalDays': figures.count,
}
