import type { FormError } from '@/components/ui/error-summary'
import type { ShownNoShipDay } from '@/shared/contracts/no-ship-days'
import { printLongDay } from '@/shared/times/print-time'

/** "Monday, September 6, 2027". */
export const noShipDayWords = (day: string) => printLongDay(`${day}T12:00:00Z`, 'UTC')

const LEAST_LETTERS = 2

export function noShipDayErrors(
  given: { day: string; why: string },
  taken: readonly Pick<ShownNoShipDay, 'day' | 'isOff'>[],
): FormError[] {
  const errors: FormError[] = []
  if (given.day === '') errors.push({ fieldId: 'no-ship-day', message: 'Which day?' })
  else if (taken.some(({ day, isOff }) => day === given.day && !isOff))
    errors.push({ fieldId: 'no-ship-day', message: 'That day is on the list already.' })
  if (given.why.trim().length < LEAST_LETTERS)
    errors.push({ fieldId: 'no-ship-why', message: 'What is on that day?' })
  return errors
}
