import type { SearchFilters, SearchAsked } from '@/shared/contracts/search'

export type Category = NonNullable<SearchFilters['category']>
export type Sort = NonNullable<SearchAsked['sort']>

/** What Find asks for, as it stands in the address: metric, cents and ISO days, so that a shared link means the same. */
export interface FindState {
  near?: string
  withinKm?: number
  category?: Category
  species?: string
  sizeFromMm?: number
  sizeToMm?: number
  count?: number
  from?: string
  until?: string
  mostCents?: number
  pickup?: 'yes'
  /** ISO week in which it can be shipped to `near`. */
  shipWeek?: number
  sort?: Sort
}

export type Params = Record<string, string | string[] | undefined>

export const categories: readonly Category[] = ['fish', 'worms', 'media', 'produce']
export const sorts: readonly Sort[] = ['nearest', 'cheapest', 'soonest', 'best-rated']
export const usualWithinKm = 161

const nearShape = /^(\d{5}|\d{2,3}\.\d{1,4}\.\d{1,4})$/
const dayShape = /^\d{4}-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/

/** Reads the address. A part that cannot be meant is left out, not an error: links get cut and mistyped. */
export function readFind(params: Params): FindState {
  const text = (name: string) => {
    const given = params[name]
    return Array.isArray(given) ? given[0] : given
  }
  const whole = (name: string, most: number) => {
    const given = text(name)
    const value = given && /^\d{1,8}$/.test(given) ? Number(given) : 0
    return value >= 1 && value <= most ? value : undefined
  }
  const fitting = (name: string, shape: RegExp) => {
    const given = text(name)
    return given && shape.test(given) ? given : undefined
  }
  const day = (name: string) => {
    const given = fitting(name, dayShape)
    return given && isRealDay(given) ? given : undefined
  }
  return inOrder({
    near: fitting('near', nearShape),
    withinKm: whole('withinKm', 4000),
    category: categories.find((one) => one === text('category')),
    species: fitting('species', /^[a-z_]{1,60}$/),
    sizeFromMm: whole('sizeFromMm', 2000),
    sizeToMm: whole('sizeToMm', 2000),
    count: whole('count', 1_000_000),
    from: day('from'),
    until: day('until'),
    mostCents: whole('mostCents', 10_000_000),
    pickup: text('pickup') === 'yes' ? 'yes' : undefined,
    shipWeek: whole('shipWeek', 53),
    sort: sorts.find((one) => one === text('sort') && one !== 'nearest'),
  })
}

/** The same as texts for the address; every part is named so that a part left out is taken out. */
export function writeFind(state: FindState): Record<keyof FindState, string | undefined> {
  const text = (value: string | number | undefined) => (value === undefined ? undefined : String(value))
  return {
    near: state.near,
    withinKm: text(state.withinKm),
    category: state.category,
    species: state.species,
    sizeFromMm: text(state.sizeFromMm),
    sizeToMm: text(state.sizeToMm),
    count: text(state.count),
    from: state.from,
    until: state.until,
    mostCents: text(state.mostCents),
    pickup: state.pickup,
    shipWeek: text(state.shipWeek),
    sort: state.sort === 'nearest' ? undefined : state.sort,
  }
}

/** What the two searches send: the filters without the order. */
export function toFilters(state: FindState, near: string): Omit<SearchAsked, 'sort' | 'cursor' | 'limit'> {
  const { sort: _sort, near: _near, ...filters } = state
  return { ...filters, near, withinKm: state.withinKm ?? usualWithinKm }
}

// 2027-02-31 would become March 3rd; a day that is not on the calendar was not meant.
const isRealDay = (day: string) => new Date(`${day}T00:00:00Z`).toISOString().startsWith(day)

/** "From 4 to 2 inches" is read as meant. */
function inOrder(given: { [Part in keyof FindState]: FindState[Part] | undefined }): FindState {
  const state = withoutGaps(given)
  const { sizeFromMm, sizeToMm, from, until } = state
  const isSizeTurned = sizeFromMm !== undefined && sizeToMm !== undefined && sizeFromMm > sizeToMm
  const areDaysTurned = from !== undefined && until !== undefined && from > until
  return {
    ...state,
    ...(isSizeTurned ? { sizeFromMm: sizeToMm, sizeToMm: sizeFromMm } : {}),
    ...(areDaysTurned ? { from: until, until: from } : {}),
  }
}

function withoutGaps(state: { [Part in keyof FindState]: FindState[Part] | undefined }): FindState {
  return Object.fromEntries(Object.entries(state).filter(([, value]) => value !== undefined))
}
