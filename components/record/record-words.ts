import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'
import type { SellerRecord, StatementRow } from '@/shared/contracts/statements'
import { informLine } from '@/shared/domain/selling/inform-count'

/** "May 2027" for '2027-05'. */
export function monthName(month: string): string {
  return new Date(`${month}-15T12:00:00Z`).toLocaleDateString('en-US', {
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  })
}

/** "May" for '2027-05', with the year in January, so that a turn of the year shows. */
export function shortMonth(month: string): string {
  const isJanuary = month.endsWith('-01')
  return new Date(`${month}-15T12:00:00Z`).toLocaleDateString('en-US', {
    month: 'short',
    ...(isJanuary ? { year: '2-digit' } : {}),
    timeZone: 'UTC',
  })
}

export const kindWords: Record<StatementRow['kind'], string> = {
  complete: 'Complete',
  kept: 'Deposit kept',
}

/** Where the seller stands with the federal line for high-volume sellers, in a sentence or two. */
export function informWords({ sales, grossCents, isOver, dueOn }: SellerRecord['inform']): string {
  const stands = `${printCount(sales)} ${sales === 1 ? 'sale' : 'sales'} and ${printCents(grossCents)} in your fullest twelve months of the last two years`
  const line = `${informLine.sales} sales and ${printCents(informLine.grossCents)}`
  if (!isOver)
    return `${stands}. From ${line} on a federal law asks platforms for your bank, contact and tax details.`
  return `${stands}: over the line of ${line}. A federal law asks platforms to have your bank, contact and tax details${dueOn ? ` by ${longDay(dueOn)}` : ''}; our payment processor keeps them. Look at your payouts page to see whether anything is missing.`
}

const longDay = (day: string) =>
  new Date(`${day}T12:00:00Z`).toLocaleDateString('en-US', { dateStyle: 'long', timeZone: 'UTC' })
