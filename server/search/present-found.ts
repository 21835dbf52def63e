import { describeListing } from '@/server/listings/describe-listing'
import { findPhotos } from '@/server/photos/photo-store'
import type { FoundPlace } from '@/server/places/find-place'
import { askGate, taxaOf } from '@/server/rules/ask-gate'
import { presentGate } from '@/server/rules/present-gate'
import { loadRules } from '@/server/rules/rule-store'
import { readFound, type FoundFacts } from '@/server/search/found-store'
import { readWindowsWithRoom, type OpenWindow } from '@/server/search/projection-store'
import type { SearchHit } from '@/server/search/search-query'
import { presentRating } from '@/server/sellers/present-seller-card'
import type { FoundListing } from '@/shared/contracts/search'
import { bearingWords } from '@/shared/domain/geo/bearing-words'
import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import { findTaxon } from '@/shared/domain/species/find-taxon'

interface Around {
  place: FoundPlace
  at: Date
  count?: number | undefined
}

interface Beside {
  windows: OpenWindow[]
  grounds: ReadonlyMap<string, string>
}

/** What a tag says wherever its reader is. */
type PlacelessTag = Omit<FoundListing, 'distanceKm' | 'bearing' | 'legal'>

/** The gate for each kind of animal and state on the page, judged once: a page holds many of a few kinds. */
function legalBook(
  rules: SpeciesRule[],
  { place, at }: Around,
): (facts: FoundFacts) => FoundListing['legal'] {
  const today = at.toISOString().slice(0, 10)
  const judged = new Map<string, FoundListing['legal']>()
  return ({ body, state }) => {
    const key = `${body.taxonId}|${state}|${/\d/.test(body.licenceNumbers)}`
    const known = judged.get(key)
    if (known) return known
    const asked = { body, sellerState: state, buyerState: place.state, viewer: 'visitor' } as const
    const taxa = taxaOf(body.taxonId)
    const own = rules.filter((rule) => taxa.includes(rule.taxonId))
    const { status, buy } = presentGate(askGate(asked, own, today), asked)
    judged.set(key, { status, buy })
    return { status, buy }
  }
}

async function readLegalBook(all: FoundFacts[], around: Around) {
  const rules = await loadRules({
    taxonIds: [...new Set(all.flatMap(({ body }) => taxaOf(body.taxonId)))],
    jurisdictions: [...new Set(['US', around.place.state, ...all.map(({ state }) => state)])],
  })
  return legalBook(rules, around)
}

async function readGrounds(all: FoundFacts[]): Promise<Map<string, string>> {
  const photos = await findPhotos(
    all.flatMap(({ body }) => body.photos.slice(0, 1).map((photo) => photo.photoId)),
  )
  return new Map(photos.map((photo) => [photo.id, photo.ground]))
}

/** What so many cost; left out where no order may come to that much. */
function totalOf(unitCents: number, count: number | undefined): { totalCents?: number } {
  const totalCents = unitCents * (count ?? 0)
  return count === undefined || totalCents > mostOrderCents ? {} : { totalCents }
}

function presentTag(
  hit: Pick<SearchHit, 'listingId' | 'unitCents'>,
  facts: FoundFacts,
  { beside, count }: { beside: Beside; count?: number | undefined },
): PlacelessTag {
  const { body, cellLat: lat, cellLng: lng } = facts
  const taxon = findTaxon(body.taxonId)
  const next = beside.windows.find((window) => window.listingId === facts.listingId)
  const rating = presentRating(facts)
  return {
    listingId: facts.publicId,
    category: body.category,
    ...describeListing(body, beside.grounds),
    ...(taxon ? { scientificName: taxon.scientificName } : {}),
    ...(taxon?.speciesId ? { speciesId: taxon.speciesId } : {}),
    stage: body.stage,
    sizeLoMm: body.sizeLoMm,
    sizeHiMm: body.sizeHiMm,
    free: facts.free,
    minOrder: body.minOrder,
    unitCents: hit.unitCents,
    ...totalOf(hit.unitCents, count),
    waterC: body.water.temperatureC,
    farmName: facts.farmName,
    placeText: `${facts.city}, ${facts.state}`,
    state: facts.state,
    lat,
    lng,
    ...(next ? { nextPickup: { startsAt: next.startsAt.toISOString(), zone: next.zone } } : {}),
    ...(rating ? { rating } : {}),
  }
}

/** Tags for a page of hits, in their order; one query a table however many there are. */
export async function presentFound(hits: SearchHit[], around: Around): Promise<FoundListing[]> {
  const ids = hits.map((hit) => hit.listingId)
  const [found, windows] = await Promise.all([readFound(ids), readWindowsWithRoom(ids, around.at)])
  const all = [...found.values()]
  const [grounds, legal] = await Promise.all([readGrounds(all), readLegalBook(all, around)])
  const beside = { windows, grounds }
  return hits.flatMap((hit) => {
    const facts = found.get(hit.listingId)
    if (!facts) return []
    const here = { lat: facts.cellLat, lng: facts.cellLng }
    return [
      {
        ...presentTag(hit, facts, { beside, count: around.count }),
        distanceKm: hit.distanceKm,
        bearing: bearingWords(around.place.centre, here) ?? 'here',
        legal: legal(facts),
      },
    ]
  })
}

/** The same for a reader whose place is not known: without distance and law. */
export async function presentPlaceless(
  hits: Pick<SearchHit, 'listingId' | 'unitCents'>[],
  at: Date,
): Promise<PlacelessTag[]> {
  const ids = hits.map((hit) => hit.listingId)
  const [found, windows] = await Promise.all([readFound(ids), readWindowsWithRoom(ids, at)])
  const beside = { windows, grounds: await readGrounds([...found.values()]) }
  return hits.flatMap((hit) => {
    const facts = found.get(hit.listingId)
    return facts ? [presentTag(hit, facts, { beside })] : []
  })
}
