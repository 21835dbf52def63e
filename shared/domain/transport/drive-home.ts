import { designWeather } from '@/shared/domain/climate/design-weather'
import type { NormalDay } from '@/shared/domain/climate/normal-day'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { HomeContainer } from '@/shared/domain/transport/home-containers.facts'
import type { Leg } from '@/shared/domain/transport/leg-air'
import type { Animals, SourceWater, TripAnswer, Vessel } from '@/shared/domain/transport/trip'

/** Where the container stands on the way. */
export type Ride = 'cabin' | 'van' | 'outdoor'

export interface DriveHome {
  animals: Animals
  water: SourceWater
  container: Pick<HomeContainer, 'waterL' | 'box'>
  aeration: Vessel['aeration']
  ride: Ride
  driveHours: number
  /** Minutes the closed car stands in the sun on the way. */
  parkedMinutes: number
  /** Hour of the day at the gate, 0-24. */
  departHour: number
  origin: NormalDay
  destination: NormalDay
}

/** Nine of ten such days are no colder and no hotter: the promise the page makes. */
const CONFIDENCE = 0.9

/** Roads wind, and towns are slow: a quarter more than the straight way, at 45 mph. House rule. */
const DETOUR = 1.25
const KM_PER_HOUR = 72
/** Never less: loading, and the last street. */
const LEAST_HOURS = 0.25

/** Hours of a drive over a straight distance, to the quarter of an hour above. */
export function driveHoursFor(distanceKm: number): number {
  return Math.max(LEAST_HOURS, Math.ceil(((distanceKm * DETOUR) / KM_PER_HOUR) * 4) / 4)
}

/**
 * Whether these animals survive the drive home in nine of ten such days. Half of the way has the air of the seller's
 * place, half that of the buyer's; a stop stands at the end of the first half. Figures as in `checkTrip`.
 */
export function checkDriveHome(drive: DriveHome): TripAnswer | null {
  const [origin, destination] = [drive.origin, drive.destination].map((day) =>
    designWeather(day, 1, CONFIDENCE),
  )
  if (!origin || !destination) return null
  const half = { hours: drive.driveHours / 2, exposure: drive.ride }
  const stop: Leg[] =
    drive.parkedMinutes > 0
      ? [{ hours: drive.parkedMinutes / 60, exposure: 'parked-car', end: 'destination' }]
      : []
  return checkTrip({
    animals: drive.animals,
    water: drive.water,
    container: { kind: 'vessel', ...drive.container, aeration: drive.aeration },
    legs: [{ ...half, end: 'origin' }, ...stop, { ...half, end: 'destination' }],
    departHour: drive.departHour,
    weather: { origin, destination },
  })
}
