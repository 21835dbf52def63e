import { useLocalSearchParams, useRouter } from 'expo-router'

import { readFind, toFilters, writeFind, type FindState } from './find-params'
import { useMarkedHistory } from './use-marked-history'

import { useCurrentPlace } from '@/hooks/use-current-place'
import type { KeptPlace } from '@/hooks/kept-place'
import { useFacets, useSearch } from '@/hooks/use-search'

// Lebanon, Kansas, the middle of the 48 states (from memory), and a circle that holds them all: what is looked at
// as long as nobody has said where they are. No distance and no legal status is shown from there.
const middleZip = '66952'
const wholeCountryKm = 4000

/** The state of Find is its address; changes go there and come back from there. */
export function useFind() {
  const router = useRouter()
  const state = readFind(useLocalSearchParams())
  const { place, isKnown, choose } = useCurrentPlace()
  const near = state.near ?? place?.near
  const asked = near
    ? { ...toFilters(state, near), sort: state.sort ?? 'nearest' }
    : {
        ...toFilters(withoutShipping(state), middleZip),
        withinKm: wholeCountryKm,
        sort: orderWithoutPlace(state),
      }
  const isReady = near !== undefined || isKnown
  const search = useSearch(asked, isReady)
  const { sort: _sort, ...filters } = asked
  const facets = useFacets(filters, isReady && search.isSuccess)
  const first = search.data?.pages[0]

  const go = (next: FindState) => router.navigate({ pathname: '/', params: writeFind(next) })
  const markHere = useMarkedHistory((params) => go(readFind(params)))
  function change(part: Partial<FindState>) {
    markHere()
    go({ ...state, ...part })
  }
  function choosePlace(chosen: KeptPlace) {
    choose(chosen)
    change({ near: chosen.near })
  }
  return {
    state,
    /** undefined until somebody has said where they are. */
    near,
    placeLabel: near ? (place?.near === near ? place.label : (first?.place.label ?? '')) : '',
    /** True when the place of the address is not the one in use: links must then carry it. */
    isElsewhere: near !== undefined && near !== place?.near,
    sort: asked.sort,
    search,
    place: near ? first?.place : undefined,
    /** The Monday of this week by the server's clock; undefined until the first answer. */
    thisMonday: first?.thisMonday,
    found: search.data?.pages.flatMap((page) => page.items) ?? [],
    facets: facets.data,
    change,
    choosePlace,
  }
}

export type Find = ReturnType<typeof useFind>

// Nowhere is known to ship to.
const withoutShipping = ({ shipWeek: _shipWeek, ...state }: FindState): FindState => state

// Nobody's distance is known, so nearest means nothing.
function orderWithoutPlace({ sort }: FindState) {
  return sort === undefined || sort === 'nearest' ? 'soonest' : sort
}
