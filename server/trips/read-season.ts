import { now } from '@/server/clock'
import { requirePlace } from '@/server/places/find-place'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import { isoWeekOf } from '@/shared/domain/season/iso-week'
import { nextSafeWeek, seasonStrip, WEEKS_A_YEAR } from '@/shared/domain/season/season-at'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import { animalClassOf, packingClassIds } from '@/shared/domain/season/season-lane'
import { findSpecies } from '@/shared/domain/species/find-species'

type Asked = ParsedQuery<Endpoints['readSeason']>
type Reply = ReplyOf<Endpoints['readSeason']>

const noSuch = (pointer: string, detail: string) =>
  new Problem('fields-invalid', undefined, { errors: [{ detail, pointer }] })

/** The year in 52 verdicts, by climatology between the climate bands of both areas. */
export async function readSeason({ from, to, species, packing }: Asked): Promise<Reply> {
  const record = findSpecies(species)
  const animals = record && animalClassOf(record.id)
  if (!animals) throw noSuch('query:species', 'We hold no figures for this animal.')
  const packed = packingClassIds.find((id) => id === packing)
  if (!packed) throw noSuch('query:packing', 'Choose one of the packings we reckon with.')
  const [origin, destination] = await Promise.all([
    requirePlace(from, 'query:from'),
    requirePlace(to, 'query:to'),
  ])
  const shipment = {
    origin: seasonBandAt(origin.centre.lat, origin.centre.lng),
    destination: seasonBandAt(destination.centre.lat, destination.centre.lng),
    animals,
    packing: packed,
  }
  const today = now().toISOString().slice(0, 10)
  const week = Math.min(isoWeekOf(today) ?? 1, WEEKS_A_YEAR)
  const next = nextSafeWeek(shipment, week)
  return {
    year: now().getUTCFullYear(),
    week,
    weeks: seasonStrip(shipment).map(({ verdict, forCold, forHeat }) => ({
      verdict,
      ...(forCold ? { forCold } : {}),
      ...(forHeat ? { forHeat } : {}),
    })),
    ...(next === null ? {} : { nextSafeWeek: next }),
  }
}
