import { convertQuantity } from '@/shared/units/convert-quantity'
import { roundTo } from '@/shared/units/round-to'
import type { UnitSystem } from '@/shared/units/unit-system'

/** US liquid gallon and cubic foot, exact. */
export const litresPerGallon = 3.785411784
export const litresPerCubicFoot = 28.316846592
const litresIn: Record<string, number> = {
  ml: 0.001,
  l: 1,
  liter: 1,
  liters: 1,
  litre: 1,
  litres: 1,
  m3: 1000,
  gal: litresPerGallon,
  gals: litresPerGallon,
  gallon: litresPerGallon,
  gallons: litresPerGallon,
  qt: litresPerGallon / 4,
  quart: litresPerGallon / 4,
  quarts: litresPerGallon / 4,
  'cu ft': litresPerCubicFoot,
  'cubic feet': litresPerCubicFoot,
  'cubic foot': litresPerCubicFoot,
  ft3: litresPerCubicFoot,
}

/** L → US gal, no rounding. */
export const gallonsFromL = (volumeL: number) => volumeL / litresPerGallon
/** US gal → L, no rounding. */
export const litresFromGallons = (gallons: number) => gallons * litresPerGallon

/** '75 gal', '50 L', '2 cu ft' → L; a bare number is read as gal or L. null: not readable. */
export function parseVolumeL(text: string, units: UnitSystem): number | null {
  return convertQuantity(text, litresIn, units === 'us' ? 'gal' : 'l')
}

/** '75 gal', '2.5 gal'; '284 L', '7.6 L'. */
export function printVolume(volumeL: number, units: UnitSystem): string {
  const value = units === 'us' ? gallonsFromL(volumeL) : volumeL
  return `${roundTo(value, value >= 20 ? 1 : 0.1).toLocaleString('en-US')} ${units === 'us' ? 'gal' : 'L'}`
}

/** Media is sold by the bag: '1.8 cu ft' or '50 L'. */
export function printDryVolume(volumeL: number, units: UnitSystem): string {
  if (units === 'metric') return printVolume(volumeL, 'metric')
  return `${roundTo(volumeL / litresPerCubicFoot, 0.1).toLocaleString('en-US')} cu ft`
}
