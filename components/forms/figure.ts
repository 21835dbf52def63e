import { parseCount, printCount } from '@/shared/units/count'
import { cmFromQuarterInches, parseLengthCm, printLength, quarterInchesFromCm } from '@/shared/units/length'
import { parseDollars, printCents } from '@/shared/units/money'
import { parseQuantity } from '@/shared/units/parse-quantity'
import { parseTemperatureC, printTemperature } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

/** How one kind of figure is read from what a person types, and printed back. */
export interface Figure {
  /** null: not readable. */
  read: (text: string, units: UnitSystem) => number | null
  print: (value: number, units: UnitSystem) => string
}

const tenths = (value: number) => Number(value.toFixed(1)).toLocaleString('en-US')

/** A bare number, or one with any of these units behind it. */
const plain = (units: readonly string[]) => ({
  read: (text: string) => {
    const quantity = parseQuantity(text)
    return quantity && ['', ...units].includes(quantity.unit) ? quantity.value : null
  },
  print: tenths,
})

// 57.15 mm is not exact in binary; two decimals are far finer than a fish.
const toHundredths = (value: number) => Number(value.toFixed(2))

export const figures = {
  /** mm inside, kept in quarter inches. */
  batchLengthMm: {
    read: (text, units) => {
      const cm = parseLengthCm(text, units)
      return cm === null ? null : toHundredths(cmFromQuarterInches(quarterInchesFromCm(cm)) * 10)
    },
    print: (mm, units) => printLength(mm / 10, units),
  },
  count: { read: parseCount, print: printCount },
  cents: { read: parseDollars, print: printCents },
  temperatureC: { read: parseTemperatureC, print: printTemperature },
  pH: plain([]),
  ppm: plain(['ppm', 'mg/l']),
  saltPpt: plain(['ppt', 'g/l']),
  percent: plain(['%', 'percent']),
  hours: plain(['h', 'hour', 'hours']),
} as const satisfies Record<string, Figure>
