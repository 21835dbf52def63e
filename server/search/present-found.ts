import { describeListing } from '@/server/listings/describe-listing'
import { presentShipped } from '@/server/listings/present-shipped'
import type { SeasonWeek } from '@/server/listings/season-week'
import { findPhotos } from '@/server/photos/photo-store'
import type { FoundPlace } from '@/server/places/find-place'
import { askGate, taxaOf } from '@/server/rules/ask-gate'
import { presentGate } from '@/server/rules/present-gate'
import { loadRules } from '@/server/rules/rule-store'
import { readFound, type FoundFacts } from '@/server/search/found-store'
import { readWindowsWithRoom, type OpenWindow } from '@/server/search/projection-store'
import type { SearchHit } from '@/server/search/search-query'
import { presentRating } from '@/server/sellers/present-seller-card'
import type { ListingBody } from '@/shared/contracts/listings'
import type { FoundListing } from '@/shared/contracts/search'
import { bearingWords } from '@/shared/domain/geo/bearing-words'
import { thingsOf } from '@/shared/domain/listings/count-words'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { printLotPrice } from '@/shared/domain/listings/lot-price'
import { lotSize } from '@/shared/domain/listings/lot-size'
import { printSaleUnit } from '@/shared/domain/listings/sale-unit'
import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import { findTaxon } from '@/shared/domain/species/find-taxon'

interface Around {
  place: FoundPlace
  /** Where and when what is shipped would arrive. */
  destination: FoundPlace
  when: SeasonWeek
  at: Date
  count?: number | undefined
}

interface Beside {
  windows: OpenWindow[]
  grounds: ReadonlyMap<string, string>
}

/** What a tag says wherever its reader is. */
type PlacelessTag = Omit<FoundListing, 'distanceKm' | 'bearing' | 'legal' | 'shipped'>

type LegalBook = (facts: FoundFacts) => FoundListing['legal']

/** The gate for each kind of animal and a buyer of that state, judged once: a page holds many of a few kinds. */
function legalBook(rules: SpeciesRule[], buyerState: string, at: Date): LegalBook {
  const today = at.toISOString().slice(0, 10)
  const judged = new Map<string, FoundListing['legal']>()
  return ({ body, state }) => {
    const { taxonId, papers } = gateOf(body)
    const key = `${body.category}|${taxonId ?? ''}|${state}|${/\d/.test(papers)}`
    const known = judged.get(key)
    if (known) return known
    const asked = { body, sellerState: state, buyerState, viewer: 'visitor' } as const
    const taxa = taxaOf(body)
    const own = rules.filter((rule) => taxa.includes(rule.taxonId))
    const { status, buy } = presentGate(askGate(asked, own, today), asked)
    judged.set(key, { status, buy })
    return { status, buy }
  }
}

/** Of the place searched from, and of the one where what is shipped would arrive. */
async function readLegalBooks(all: FoundFacts[], { place, destination, at }: Around) {
  const rules = await loadRules({
    taxonIds: [...new Set(all.flatMap(({ body }) => taxaOf(body)))],
    jurisdictions: [...new Set(['US', place.state, destination.state, ...all.map(({ state }) => state)])],
  })
  const legal = legalBook(rules, place.state, at)
  const legalThere = destination.state === place.state ? legal : legalBook(rules, destination.state, at)
  return { legal, legalThere }
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

/** What it is, as far as there is a name for it beside the title. */
function kindOf(body: ListingBody) {
  if (body.category === 'media') return { material: body.material }
  if (body.category === 'produce') return { cropId: body.cropId }
  const taxon = findTaxon(body.taxonId)
  const size = lotSize(body)
  return {
    ...(taxon ? { scientificName: taxon.scientificName } : {}),
    ...(taxon?.speciesId ? { speciesId: taxon.speciesId } : {}),
    ...(size ? { sizeLoMm: size.loMm, sizeHiMm: size.hiMm } : {}),
    ...(body.category === 'fish' ? { stage: body.stage, waterC: body.water.temperatureC } : {}),
  }
}

/** What one unit is, and the price that offers are compared by, printed here: the tables behind it stay on the server. */
function soldAs(body: ListingBody, unitCents: number): Pick<FoundListing, 'soldBy' | 'comparable'> {
  if (body.category === 'fish') return {}
  const us = printLotPrice(body, unitCents, 'us').comparable
  const metric = printLotPrice(body, unitCents, 'metric').comparable
  return {
    soldBy: printSaleUnit(body.saleUnit, thingsOf(body)),
    ...(us !== null && metric !== null ? { comparable: { us, metric } } : {}),
  }
}

function presentTag(
  hit: Pick<SearchHit, 'listingId' | 'unitCents'>,
  facts: FoundFacts,
  { beside, count }: { beside: Beside; count?: number | undefined },
): PlacelessTag {
  const { body, cellLat: lat, cellLng: lng } = facts
  const next = beside.windows.find((window) => window.listingId === facts.listingId)
  const rating = presentRating(facts)
  return {
    listingId: facts.publicId,
    category: body.category,
    ...describeListing(body, beside.grounds),
    ...kindOf(body),
    ...soldAs(body, hit.unitCents),
    free: facts.free,
    minOrder: body.minOrder,
    unitCents: hit.unitCents,
    ...totalOf(hit.unitCents, count),
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
  const [grounds, { legal, legalThere }] = await Promise.all([readGrounds(all), readLegalBooks(all, around)])
  const { destination: to, when } = around
  const beside = { windows, grounds }
  return hits.flatMap((hit) => {
    const facts = found.get(hit.listingId)
    if (!facts) return []
    const here = { lat: facts.cellLat, lng: facts.cellLng }
    const { status } = legalThere(facts)
    const shipped = presentShipped({ body: facts.body, from: here, to, status, when })
    return [
      {
        ...presentTag(hit, facts, { beside, count: around.count }),
        distanceKm: hit.distanceKm,
        bearing: bearingWords(around.place.centre, here) ?? 'here',
        legal: legal(facts),
        ...(shipped ? { shipped } : {}),
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
