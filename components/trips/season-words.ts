import { shortDay } from '@/components/listings/shipping-words'
import type { Tone } from '@/constants/theme'
import type { SeasonVerdict } from '@/shared/domain/season/season-at'
import { mondayOfWeek } from '@/shared/times/monday-of-week'

export const seasonWords: Record<SeasonVerdict, { word: string; tone: Exclude<Tone, 'neutral' | 'today'> }> =
  {
    safe: { word: 'safe', tone: 'safe' },
    'safe-with-packs': { word: 'safe with packs', tone: 'info' },
    'too-cold': { word: 'too cold', tone: 'cold' },
    'too-hot': { word: 'too hot', tone: 'hot' },
    unknown: { word: 'not known', tone: 'caution' },
  }

/** "Jan 12" for the Monday that begins an ISO week. */
export function weekWords(year: number, week: number): string {
  return shortDay(mondayOfWeek(year, week))
}

interface Run {
  verdict: SeasonVerdict
  from: number
  to: number
}

/** Weeks in a row with one verdict, in the order given. */
export function seasonRuns(weeks: readonly SeasonVerdict[]): Run[] {
  return weeks.reduce<Run[]>((runs, verdict, at) => {
    const last = runs.at(-1)
    if (last?.verdict === verdict) last.to = at + 1
    else runs.push({ verdict, from: at + 1, to: at + 1 })
    return runs
  }, [])
}

/** "Too cold: weeks of Jan 4 to Mar 8. Safe with packs: week of Mar 15." */
export function seasonSummary(weeks: readonly SeasonVerdict[], mondays: readonly string[]): string {
  const day = (week: number) => shortDay(mondays[week - 1] ?? '')
  return seasonRuns(weeks)
    .map(({ verdict, from, to }) => {
      const { word } = seasonWords[verdict]
      const when = from === to ? `week of ${day(from)}` : `weeks of ${day(from)} to ${day(to)}`
      return `${word.charAt(0).toUpperCase()}${word.slice(1)}: ${when}.`
    })
    .join(' ')
}
