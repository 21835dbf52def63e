import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import type { SourceKey } from '@/shared/sources'

/** That each harvest carries a mark with date and bed is published; this form of it is our own. */
export const lotCodeSources: readonly SourceKey[] = ['lsu-traceability', 'house-rule']

export interface LotMark {
  /** MMDD of the harvest. */
  monthDay: string
  /** Letter first; null: the farm names no beds. */
  bed: string | null
  /** 1 for the first lot of that day and bed. */
  run: number
}

// L-0412, L-0412-B3, L-0412-2, L-0412-B3-2. A bed starts with a letter, so that no bed reads like a run.
const shape = /^L-(\d{4})(?:-([A-Z][A-Z0-9]{0,5}))?(?:-([2-9]|[1-9]\d))?$/
const leapYear = '2028'

/** The parts of a lot code. null: not one of ours, or its day is in no calendar. */
export function readLotCode(code: string): LotMark | null {
  const parts = shape.exec(code)
  const monthDay = parts?.[1]
  if (!parts || monthDay === undefined) return null
  if (dayOfYear(`${leapYear}-${monthDay.slice(0, 2)}-${monthDay.slice(2)}`) === null) return null
  return { monthDay, bed: parts[2] ?? null, run: parts[3] === undefined ? 1 : Number(parts[3]) }
}

/** A bed as the grower names it, as a mark: 'bed 3' → 'B3', 'East' → 'EAST'. null: nothing that fits. */
export function bedMark(typed: string): string | null {
  const letters = typed
    .toUpperCase()
    .replace(/\bBED\b/, '')
    .replace(/[^A-Z0-9]/g, '')
  if (letters === '') return null
  return (/^\d/.test(letters) ? `B${letters}` : letters).slice(0, 6)
}

/**
 * The next free code for a harvest: day YYYY-MM-DD, bed as typed or null, and the codes the seller has used for that
 * day. null: the hundredth lot of one bed and day, or no date.
 */
export function nextLotCode(harvestDay: string, bed: string | null, taken: readonly string[]): string | null {
  if (dayOfYear(harvestDay) === null) return null
  const mark = bed === null ? null : bedMark(bed)
  const start = ['L', harvestDay.slice(5).replace('-', ''), ...(mark === null ? [] : [mark])].join('-')
  for (let run = 1; run <= 99; run++) {
    const code = run === 1 ? start : `${start}-${run}`
    if (!taken.includes(code)) return code
  }
  return null
}

/** Whether a code names the day of this harvest (and so can stand on its boxes). */
export function isLotCodeOf(code: string, harvestDay: string): boolean {
  return readLotCode(code)?.monthDay === harvestDay.slice(5).replace('-', '')
}
