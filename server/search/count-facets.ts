import { now } from '@/server/clock'
import { categoryOfCode } from '@/server/search/category-codes'
import { readPlaces } from '@/server/search/read-places'
import { readWishes } from '@/server/search/read-wishes'
import { theSearch } from '@/server/search/the-search'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { countFacets as countFacetsCall, SearchFilters } from '@/shared/contracts/search'
import { findSpeciesByCode } from '@/shared/domain/species/find-species'

/** Counts beside the filters; half a minute old at most. */
export async function countFacets(asked: SearchFilters): Promise<ReplyOf<typeof countFacetsCall>> {
  const at = now()
  const { place, shipTo } = await readPlaces(asked, at)
  const wishes = readWishes(asked, { place, shipTo, today: at.toISOString().slice(0, 10) })
  const counted = await theSearch().facets({ ...wishes, sort: 'nearest', limit: 1 })
  return {
    categories: counted.categories.flatMap(({ code, count, atLeast }) => {
      const category = categoryOfCode(code)
      return category ? [{ category, count, atLeast }] : []
    }),
    species: counted.species.flatMap(({ code, count, atLeast }) => {
      const species = findSpeciesByCode(code)
      return species ? [{ speciesId: species.id, count, atLeast }] : []
    }),
  }
}
