import { categoryNames, speciesWords } from './category-words'
import type { FindState } from './find-params'

import { plainDay } from '@/components/listings/pickup-words'
import { shortDay } from '@/components/listings/shipping-words'
import { comingMonday } from '@/shared/times/coming-monday'
import { printCount } from '@/shared/units/count'
import { printLength, printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface AppliedFilter {
  /** "2–3 in". */
  words: string
  /** How an empty list offers to drop it: "any size". */
  anyWords: string
  off: Partial<FindState>
}

/** The filters in use, in words; weeks are counted from `thisMonday`. Place, distance and order are always in use and not among them. */
export function appliedWords(state: FindState, units: UnitSystem, thisMonday?: string): AppliedFilter[] {
  const told: AppliedFilter[] = []
  const tell = (words: string, anyWords: string, off: Partial<FindState>) =>
    told.push({ words, anyWords, off })
  if (state.category) tell(categoryNames[state.category], 'everything on offer', { category: undefined })
  if (state.species) tell(speciesWords(state.species), 'any species', { species: undefined })
  const size = sizeWords(state, units)
  if (size) tell(size, 'any size', { sizeFromMm: undefined, sizeToMm: undefined })
  if (state.count) tell(`${printCount(state.count)} wanted`, 'any count', { count: undefined })
  const days = dayWords(state)
  if (days) tell(days, 'any day', { from: undefined, until: undefined })
  if (state.mostCents)
    tell(`Up to ${printCents(state.mostCents)} each`, 'any price', { mostCents: undefined })
  if (state.pickup) tell('Pickup only', 'pickup or not', { pickup: undefined })
  if (state.shipWeek)
    tell(shippedWords(state.shipWeek, thisMonday), 'shipped or not', { shipWeek: undefined })
  return told
}

// Before the first answer nobody knows which week it is.
function shippedWords(week: number, thisMonday: string | undefined): string {
  if (!thisMonday) return 'Can be shipped'
  const monday = comingMonday(thisMonday, week)
  return monday === thisMonday ? 'Can be shipped this week' : `Can be shipped, week of ${shortDay(monday)}`
}

function sizeWords({ sizeFromMm, sizeToMm }: FindState, units: UnitSystem): string {
  if (sizeFromMm !== undefined && sizeToMm !== undefined) {
    return printLengthRange({ minCm: sizeFromMm / 10, maxCm: sizeToMm / 10 }, units)
  }
  if (sizeFromMm !== undefined) return `From ${printLength(sizeFromMm / 10, units)}`
  return sizeToMm === undefined ? '' : `Up to ${printLength(sizeToMm / 10, units)}`
}

function dayWords({ from, until }: FindState): string {
  if (from && until) return from === until ? plainDay(from) : `${plainDay(from)} to ${plainDay(until)}`
  if (from) return `From ${plainDay(from)}`
  return until ? `Until ${plainDay(until)}` : ''
}
