import { roundTo } from '@/shared/units/round-to'
import { readNumber } from '@/shared/units/read-number'
import type { UnitSystem } from '@/shared/units/unit-system'

/** °C → °F, exact definition, no rounding. */
export const fahrenheitFromC = (degreesC: number) => degreesC * 1.8 + 32
/** °F → °C, exact definition, no rounding. */
export const celsiusFromF = (degreesF: number) => (degreesF - 32) / 1.8

const shape = /^(-|−)?\s*([\d.,]+)\s*(?:°|deg(?:rees)?)?\s*(c|f|celsius|fahrenheit)?$/

/** Whole degrees Fahrenheit, half degrees Celsius: '68 °F', '20 °C'. */
export function printTemperature(degreesC: number, units: UnitSystem): string {
  return units === 'us' ? `${roundTo(fahrenheitFromC(degreesC), 1)} °F` : `${roundTo(degreesC, 0.5)} °C`
}

/** Both scales, for figures that decide life and death: '68 °F (20 °C)'. */
export function printBothTemperatures(degreesC: number, units: UnitSystem): string {
  const other: UnitSystem = units === 'us' ? 'metric' : 'us'
  return `${printTemperature(degreesC, units)} (${printTemperature(degreesC, other)})`
}

/** How far two temperatures lie apart, in both scales: '9 °F (5 °C)'. The sign is the caller's to say. */
export function printBothSpans(spanC: number, units: UnitSystem): string {
  const apart = Math.abs(spanC)
  const [us, metric] = [`${roundTo(apart * 1.8, 1)} °F`, `${roundTo(apart, 0.5)} °C`]
  return units === 'us' ? `${us} (${metric})` : `${metric} (${us})`
}

/** '68', '68 F', '20 °C' → °C; a bare number is read in `units`. null: not readable or outside −60…100 °C. */
export function parseTemperatureC(text: string, units: UnitSystem): number | null {
  const parts = shape.exec(text.trim().toLowerCase())
  const size = parts && readNumber(parts[2] ?? '')
  if (!parts || size === null) return null
  const signed = parts[1] ? -size : size
  const isCelsius = parts[3] ? parts[3].startsWith('c') : units === 'metric'
  const degreesC = isCelsius ? signed : celsiusFromF(signed)
  return degreesC >= -60 && degreesC <= 100 ? degreesC : null
}
