import { reasonTexts } from '@/shared/domain/transport/reason-texts.facts'
import type { Reason, Verdict } from '@/shared/domain/transport/verdict'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

import { printFigure } from '@/components/tools/print-figure'
import type { Tone } from '@/constants/theme'

export const verdictWords: Record<Verdict, { title: string; tone: Exclude<Tone, 'neutral' | 'today'> }> = {
  safe: { title: 'They should arrive well', tone: 'safe' },
  caution: { title: 'It can go well, with care', tone: 'caution' },
  unsafe: { title: 'Not like this: they would suffer or die', tone: 'danger' },
  unknown: { title: 'We cannot say', tone: 'info' },
}

function figureWords(value: number, unit: string, units: UnitSystem): string {
  if (unit === '°C') return printBothTemperatures(value, units)
  return unit === '' || unit === 'ratio' ? printFigure(value) : `${printFigure(value)} ${unit}`
}

const isLeast = (code: Reason['code']) => code === 'not-fasted' || code === 'fasting-unsaid'

/** "here 3.1 mg/L, the limit is 4 mg/L, after 1.5 h"; '' for a reason without figures. */
export function reasonFigures({ code, value, limit, atHour }: Reason, units: UnitSystem): string {
  const { unit } = reasonTexts[code]
  const parts = [
    value === null ? '' : `here ${figureWords(value, unit, units)}`,
    limit === null
      ? ''
      : `${isLeast(code) ? 'it should be at least' : 'the limit is'} ${figureWords(limit, unit, units)}`,
    atHour === null || atHour === 0 ? '' : `after ${printFigure(atHour, 2)} h`,
  ].filter(Boolean)
  return parts.join(', ')
}
