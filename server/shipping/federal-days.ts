import holidays from '@18f/us-federal-holidays'

export interface FederalDay {
  /** 'YYYY-MM-DD': the day on which it is observed. */
  day: string
  why: string
}

/** Federal holidays observed in the years `first` to `last`; a New Year's Day may be observed in the year before it. */
export function federalDays(first: number, last: number): FederalDay[] {
  const years = Array.from({ length: last - first + 2 }, (_, at) => first + at)
  return years
    .flatMap((year) => holidays.allForYear(year))
    .map(({ dateString, name }) => ({ day: dateString, why: name }))
    .filter(({ day }) => Number(day.slice(0, 4)) >= first && Number(day.slice(0, 4)) <= last)
}
