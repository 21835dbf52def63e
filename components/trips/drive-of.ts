import type { ShownListing } from '@/shared/contracts/listings'
import type { WayHome } from '@/shared/contracts/trips'
import { massForLoadG } from '@/shared/domain/animals/length-to-mass'
import { findSpecies } from '@/shared/domain/species/find-species'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { DriveHome, Ride } from '@/shared/domain/transport/drive-home'
import { homeContainers } from '@/shared/domain/transport/home-containers.facts'
import type { Animals, Vessel } from '@/shared/domain/transport/trip'

/** What the buyer chooses for the drive. */
export interface DriveChoice {
  containerId: string
  aeration: Vessel['aeration']
  ride: Ride
  driveHours: number
  parkedMinutes: number
  departHour: number
}

const PPM_PER_MEQ = 50

/** The listing's animals as the trip engine reads them. null: no figures are published for them. */
export function animalsOf({ body }: Pick<ShownListing, 'body'>, count: number): Animals | null {
  if (body.category !== 'fish') return null
  const species = findSpecies(findTaxon(body.taxonId)?.speciesId ?? '')
  // The longest of the batch weigh most: plan by them.
  const massG = species && massForLoadG(species, body.sizeHiMm)
  if (!species || massG === null) return null
  return {
    ...{ species, count, massG },
    stage: body.stage === 'fry' ? 'swim-up-fry' : 'fingerling',
    shortestMm: body.sizeLoMm,
    longestMm: body.sizeHiMm,
    fastedHours: null,
  }
}

/** The drive as the trip engine reads it. null: the weather or the animals are not known. */
export function driveOf(
  listing: Pick<ShownListing, 'body'>,
  given: { count: number; choice: DriveChoice; way: WayHome },
): DriveHome | null {
  const { count, choice, way } = given
  const animals = animalsOf(listing, count)
  const container = homeContainers.find(({ id }) => id === choice.containerId)
  const { body } = listing
  if (body.category !== 'fish' || !animals || !container || !way.origin || !way.destination) return null
  const { temperatureC, khPpm, pH } = body.water
  const { aeration, ride, driveHours, parkedMinutes, departHour } = choice
  return {
    animals,
    water: { startC: temperatureC, alkalinityMeqPerL: khPpm / PPM_PER_MEQ, pH },
    container,
    ...{ aeration, ride, driveHours, parkedMinutes, departHour },
    origin: way.origin,
    destination: way.destination,
  }
}
