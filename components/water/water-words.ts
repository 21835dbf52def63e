import type { Tone } from '@/constants/theme'
import {
  isWaterFigure,
  type FigureMatch,
  type MatchVerdict,
  type WaterFigure,
} from '@/shared/domain/water/compare-waters'
import { waterMatch } from '@/shared/domain/water/water-match.facts'
import { printSource } from '@/shared/sources'
import { printCount } from '@/shared/units/count'
import { parseHardnessPpm } from '@/shared/units/hardness'
import { readNumber } from '@/shared/units/read-number'
import { roundTo } from '@/shared/units/round-to'
import {
  parseTemperatureC,
  printBothSpans,
  printBothTemperatures,
  printTemperature,
} from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

export const figureNames: Record<WaterFigure, string> = {
  waterC: 'Temperature',
  pH: 'pH',
  khPpm: 'Carbonate hardness (KH)',
}

export const verdictWords: Record<MatchVerdict, { word: string; tone: Tone }> = {
  match: { word: 'Close enough', tone: 'safe' },
  float: { word: 'Float the bag', tone: 'info' },
  slowly: { word: 'Slowly', tone: 'caution' },
  'too-far': { word: 'Too far apart', tone: 'danger' },
  'too-soft': { word: 'Yours is too soft', tone: 'caution' },
}

/** A figure with its unit; temperatures in both scales. */
export function printFigure(figure: WaterFigure, value: number, units: UnitSystem): string {
  if (figure === 'waterC') return printBothTemperatures(value, units)
  return figure === 'pH' ? String(roundTo(value, 0.01)) : `${printCount(Math.round(value))} ppm`
}

/** "Yours is 9 °F (5 °C) warmer". */
export function differenceWords({ figure, difference }: FigureMatch, units: UnitSystem): string {
  if (difference === 0) return 'The same'
  const isMore = difference > 0
  if (figure === 'waterC')
    return `Yours is ${printBothSpans(difference, units)} ${isMore ? 'warmer' : 'colder'}`
  const apart = printFigure(figure, Math.abs(difference), units)
  return `Yours is ${apart} ${isMore ? 'higher' : 'lower'}`
}

function timeWords(minutes: number | null): string {
  if (minutes === null) return ''
  if (minutes < 60) return `${minutes} minutes`
  const hours = Math.floor(minutes / 60)
  const rest = minutes % 60
  return `${hours} h${rest > 0 ? ` ${rest} min` : ''}`
}

/** What to do about one figure, in a sentence or two. */
export function adviceWords({ figure, verdict, minutes, limit }: FigureMatch, units: UnitSystem): string {
  const { stepPH, stepMinutes } = waterMatch
  const time = timeWords(minutes)
  if (verdict === 'match') return 'Nothing to do for this one.'
  if (verdict === 'too-soft') {
    return `Below ${limit} ppm the pH of a tank can swing. Raise it some days before you collect.`
  }
  if (figure === 'waterC') {
    if (verdict === 'float') return `Float the closed bag in your tank for ${time}.`
    if (verdict === 'slowly') {
      return `Take at least ${time}: no faster than ${printBothSpans(waterMatch.ratePerHourC.value, units)} an hour.`
    }
    return `More than ${printBothSpans(limit, units)} is too much in one day. Bring your tank nearer before you collect.`
  }
  if (figure === 'pH') {
    return verdict === 'slowly'
      ? `Take at least ${time}: ${stepPH.value} in ${stepMinutes.value} minutes, by adding a little of your water at a time.`
      : 'Do not let them go into it. Bring your tank nearer some days before you collect, or ask the grower.'
  }
  return 'Add a little of your water at a time. Nobody has published how fast is right.'
}

/** By whose word: what is published, and what is our own judgement. */
export function groundsWords({ sourceKey, needSourceKey }: FigureMatch): string {
  const pace = printSource(sourceKey)
  return needSourceKey
    ? `That it matters: ${printSource(needSourceKey)}. How far and how fast: ${pace}`
    : pace
}

/** A figure as typed, in the fixed unit. null: not readable, or no such water. */
export function readFigure(figure: WaterFigure, text: string, units: UnitSystem): number | null {
  const read = {
    waterC: () => parseTemperatureC(text, units),
    pH: () => readNumber(text.trim().replace(/^ph\s*/i, '')),
    khPpm: () => parseHardnessPpm(text),
  }[figure]()
  return read !== null && isWaterFigure(figure, read) ? read : null
}

/** What was kept, as a field shows it. */
export function typedFigure(figure: WaterFigure, value: number | undefined, units: UnitSystem): string {
  if (value === undefined) return ''
  if (figure === 'waterC') return printTemperature(value, units)
  return figure === 'pH' ? String(roundTo(value, 0.01)) : `${roundTo(value, 1)} ppm`
}
