import { dayWords } from './ship-day-words'

import type { FormError } from '@/components/ui/error-summary'
import type { PackingTick } from '@/shared/contracts/ship-acts'

/** What whoever packs confirms, in the order of the work (rules of the trade, A5.2 and G-14). */
export const tickWords: Record<PackingTick, { label: string; hint: string }> = {
  'packed-as-planned': {
    label: 'Packed as the sheet says',
    hint: 'Animals, water, oxygen, packs and warmth of every box.',
  },
  'strong-carton': {
    label: 'A strong double-wall carton around each box',
    hint: 'Rated for 275 lb, weather-resistant, aired, and shut so that nothing gets out.',
  },
  'contents-on-address-side': {
    label: '“Live animals” and your full return address stand on the address side',
    hint: 'The labels of the packing sheet carry both.',
  },
  'no-free-postal-box': {
    label: 'No free or flat-rate postal box',
    hint: 'They are not allowed for animals, however handy they look.',
  },
  'carrier-told': {
    label: 'The carrier was told, and takes them today',
    hint: 'Ask at the counter before you pack: rules and staff change.',
  },
}

export const tickIds = Object.keys(tickWords) as PackingTick[]

const LEAST_LETTERS = 4

export function dispatchErrors(given: { tracking: string; ticks: readonly PackingTick[] }): FormError[] {
  const errors: FormError[] = tickIds
    .filter((tick) => !given.ticks.includes(tick))
    .map((tick) => ({ fieldId: `tick-${tick}`, message: `Not yet ticked: ${tickWords[tick].label}.` }))
  if (given.tracking.trim().length < LEAST_LETTERS)
    errors.push({ fieldId: 'tracking', message: 'The tracking number from the receipt.' })
  return errors
}

/** "The nearest day on which it may leave: Mon, May 17."; null where the refusal names none. */
export function nearestDayWords(
  facts: Readonly<Record<string, string | number | boolean>> | undefined,
): string | null {
  const day = facts?.nearestShipDay
  return typeof day === 'string' ? `The nearest day on which it may leave: ${dayWords(day)}.` : null
}
