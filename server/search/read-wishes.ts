import type { FoundPlace } from '@/server/places/find-place'
import { categoryCode } from '@/server/search/category-codes'
import { safeLanesTo } from '@/server/search/safe-lanes-to'
import { dayNumber } from '@/server/search/open-days'
import type { SearchQuery } from '@/server/search/search-query'
import { speciesCodeOf } from '@/server/search/search-row-of'
import { Problem, type FieldProblem } from '@/shared/api/problem'
import type { SearchFilters } from '@/shared/contracts/search'
import { findSpecies } from '@/shared/domain/species/find-species'

const LONGEST_MM = 65_535
const FAR_AHEAD_DAYS = 3650

/** A species by its own id, or a taxon we hold care figures for. null: neither. */
function codeOf(species: string): number | null {
  return findSpecies(species)?.speciesCode ?? (speciesCodeOf(species) || null)
}

function readDays(filters: SearchFilters, today: number, wrong: FieldProblem[]): SearchQuery['days'] {
  if (!filters.from && !filters.until) return undefined
  const from = filters.from ? dayNumber(filters.from) : today
  const until = filters.until ? dayNumber(filters.until) : from + FAR_AHEAD_DAYS
  if (until < from) wrong.push({ detail: 'The last day lies before the first.', pointer: 'query:until' })
  return { from, until }
}

function readSize(filters: SearchFilters, wrong: FieldProblem[]): SearchQuery['sizeMm'] {
  const { sizeFromMm, sizeToMm } = filters
  if (sizeFromMm === undefined && sizeToMm === undefined) return undefined
  const size = { from: Math.round(sizeFromMm ?? 0), to: Math.round(sizeToMm ?? LONGEST_MM) }
  if (size.to < size.from)
    wrong.push({ detail: 'The longest is below the shortest.', pointer: 'query:sizeToMm' })
  return size
}

/** Where and in which week of the table it should arrive. */
interface ShipTo {
  place: FoundPlace
  week: number
}

const shippedTo = ({ place, week }: ShipTo): SearchQuery['shipped'] => ({
  lanes: safeLanesTo(place.centre, week),
  state: place.state,
})

/** What a buyer asks, in the codes and whole units of search; refuses wishes that contradict themselves. */
export function readWishes(
  filters: SearchFilters,
  around: { place: FoundPlace; today: string; shipTo?: ShipTo | null },
): Omit<SearchQuery, 'sort' | 'limit'> {
  const wrong: FieldProblem[] = []
  const speciesCode = filters.species === undefined ? undefined : codeOf(filters.species)
  if (speciesCode === null) {
    wrong.push({ detail: 'Pick a species from the list.', pointer: 'query:species' })
  }
  const days = readDays(filters, dayNumber(around.today), wrong)
  const sizeMm = readSize(filters, wrong)
  if (wrong.length > 0) throw new Problem('fields-invalid', undefined, { errors: wrong })
  return {
    origin: around.place.centre,
    radiusKm: filters.withinKm,
    buyerState: around.place.state,
    ...(filters.category ? { categoryCode: categoryCode(filters.category) } : {}),
    ...(speciesCode ? { speciesCode } : {}),
    ...(sizeMm ? { sizeMm } : {}),
    ...(filters.count === undefined ? {} : { count: filters.count }),
    ...(days ? { days } : {}),
    ...(filters.mostCents === undefined ? {} : { mostCents: filters.mostCents }),
    ...(filters.pickup === 'yes' ? { handover: { pickup: true, lanes: [] } } : {}),
    ...(around.shipTo ? { shipped: shippedTo(around.shipTo) } : {}),
  }
}
