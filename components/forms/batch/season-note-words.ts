import type { SeasonVerdict } from '@/shared/domain/season/season-at'

/** Fewer safe weeks than two months: told as hardly ever. House rule. */
const FEW_WEEKS = 9

const byYears = 'By the weather of many years, for a way that begins and ends in your own area.'

/** What to tell a seller of a packing that hardly ever does. null: it does often enough, or nobody knows. */
export function seasonNote(weeks: readonly SeasonVerdict[]): { title: string; body: string } | null {
  if (weeks.length === 0 || weeks.every((verdict) => verdict === 'unknown')) return null
  const safe = weeks.filter((verdict) => verdict === 'safe' || verdict === 'safe-with-packs').length
  if (safe >= FEW_WEEKS) return null
  return safe === 0
    ? {
        title: 'With this packing no week of the year is safe',
        body: `${byYears} Thicker walls or a night less on the way change that; otherwise nobody will be offered a ship day.`,
      }
    : {
        title: `With this packing only ${safe} ${safe === 1 ? 'week' : 'weeks'} of the year ${safe === 1 ? 'is' : 'are'} safe`,
        body: `${byYears} Thicker walls or a night less on the way make it more.`,
      }
}
