import { isoWeekOf } from '@/shared/domain/season/iso-week'
import { WEEKS_A_YEAR } from '@/shared/domain/season/season-at'
import { comingMonday } from '@/shared/times/coming-monday'
import { mondayOf } from '@/shared/times/monday-of'

export interface SeasonWeek {
  /** 1-52: the 53rd of a long year is judged as the 52nd. */
  week: number
  monday: string
  isThisWeek: boolean
  /** This week's, whichever week was asked for. */
  thisMonday: string
}

const ofTable = (week: number) => Math.min(week, WEEKS_A_YEAR)

/** The ISO week asked for, from today on; not asked: this one. */
export function seasonWeek(today: Date, asked?: number): SeasonWeek {
  const thisMonday = mondayOf(today.toISOString().slice(0, 10))
  const thisWeek = ofTable(isoWeekOf(thisMonday) ?? 1)
  const week = ofTable(asked ?? thisWeek)
  const monday = comingMonday(thisMonday, week)
  return { week, monday, isThisWeek: monday === thisMonday, thisMonday }
}
