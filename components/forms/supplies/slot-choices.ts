import { addDays } from '@/components/forms/day-text'

import type { WindowTyping } from '@/components/forms/batch/batch-typing'

export interface SlotChoice {
  label: string
  window: WindowTyping
}

/** Surplus is collected by several neighbours in one slot. */
const places = '10'

/** The slots most growers mean, each one tap; one that is over today is not offered. `now` is the clock at the farm. */
export function slotChoices(today: string, now: string): SlotChoice[] {
  const tomorrow = addDays(today, 1)
  const evening = { from: '17:00', until: '19:00', capacity: places }
  const slots = [
    { label: 'Today 5 to 7 PM', window: { day: today, ...evening } },
    {
      label: 'Tomorrow 7:30 to 9 AM',
      window: { day: tomorrow, from: '07:30', until: '09:00', capacity: places },
    },
    { label: 'Tomorrow 5 to 7 PM', window: { day: tomorrow, ...evening } },
  ]
  return slots.filter(({ window }) => window.day > today || now < window.from)
}

export const isSameSlot = (a: WindowTyping, b: WindowTyping) =>
  a.day === b.day && a.from === b.from && a.until === b.until
