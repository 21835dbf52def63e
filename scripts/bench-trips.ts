// `npm run bench:trips`: how long one trip, a strip of 52 weeks and a packing search take here.
// Figures only, no bars: `work` is processor time, the rest is the clock on a machine that may be busy.
import { performance } from 'node:perf_hooks'

import { shippedClimate } from '@/scripts/calc/climate-commands'
import { normalsAt } from '@/shared/domain/climate/climate-grid'
import { designWeather } from '@/shared/domain/climate/design-weather'
import { normalYear } from '@/shared/domain/climate/normal-day'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import { usualBags, usualBoxes } from '@/shared/domain/transport/packing.facts'
import { planPacking } from '@/shared/domain/transport/plan-packing'
import type { Trip } from '@/shared/domain/transport/trip'
import { findSpecies } from '@/shared/domain/species/find-species'

const species = findSpecies('nile_tilapia')
const [from, to] = [normalsAt(shippedClimate(), 33.75, -84.39), normalsAt(shippedClimate(), 41.88, -87.62)]
if (!species || !from || !to) throw new Error('The shipped tables hold no tilapia, no Atlanta or no Chicago.')
const [origin, destination] = [normalYear(from), normalYear(to)]

function tripOfDay(day: number): Trip {
  const [here, there] = [origin[day], destination[day]].map((one) => one && designWeather(one, 2, 0.9))
  if (!species || !here || !there) throw new Error(`No weather on day ${day}`)
  return {
    animals: {
      species,
      count: 100,
      massG: 1,
      stage: 'fingerling',
      shortestMm: 35,
      longestMm: 42,
      fastedHours: 24,
    },
    water: { startC: 25, alkalinityMeqPerL: 2, pH: 7.5 },
    container: {
      kind: 'bags',
      boxes: 1,
      bagsPerBox: 1,
      waterLPerBag: 8,
      oxygenLPerBag: 24,
      isDoubled: true,
      standsStill: true,
      box: { lengthCm: 40, widthCm: 30, heightCm: 30, wallMm: 38, conductivityWPerMK: 0.045 },
      packs: { heat: { id: 'heat-40h', count: 2 }, cold: null, hasAirHoles: true },
    },
    legs: [
      { hours: 4, exposure: 'outdoor', end: 'origin' },
      { hours: 12, exposure: 'depot', end: 'origin' },
      { hours: 8, exposure: 'van', end: 'destination' },
    ],
    departHour: 16,
    weather: { origin: here, destination: there },
  }
}

function report(what: string, rounds: number, run: (round: number) => unknown) {
  for (let round = 0; round < rounds; round++) run(round)
  const before = process.cpuUsage()
  const times = Array.from({ length: rounds }, (_, round) => {
    const start = performance.now()
    run(round)
    return performance.now() - start
  }).sort((a, b) => a - b)
  const at = (share: number) => (times[Math.floor((rounds - 1) * share)] ?? NaN).toFixed(3).padStart(9)
  const { user } = process.cpuUsage(before)
  const work = (user / 1000 / rounds).toFixed(3).padStart(9)
  console.log(`${what.padEnd(28)} work ${work} ms   median ${at(0.5)} ms   p95 ${at(0.95)} ms`)
}

const weeks = Array.from({ length: 52 }, (_, week) => week * 7)
report('one trip of 24 hours', 500, (round) => checkTrip(tripOfDay((round * 7) % 365)))
report('a strip of 52 weeks', 20, () => weeks.map((day) => checkTrip(tripOfDay(day)).verdict))
report('a packing search, January', 10, () =>
  planPacking({ ...tripOfDay(14), standsStill: true, boxSizes: usualBoxes, bagSizes: usualBags }),
)
report('a packing search, May', 10, () =>
  planPacking({ ...tripOfDay(135), standsStill: true, boxSizes: usualBoxes, bagSizes: usualBags }),
)
