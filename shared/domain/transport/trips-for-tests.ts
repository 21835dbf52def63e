import type { Animals, BaggedBoxes, Trip, Vessel } from '@/shared/domain/transport/trip'
import { findSpecies } from '@/shared/domain/species/find-species'
import type { SpeciesId } from '@/shared/domain/species/species.facts'

export const foamBox = { lengthCm: 40, widthCm: 30, heightCm: 30, wallMm: 38, conductivityWPerMK: 0.036 }

export function animals(id: SpeciesId, changes: Partial<Animals> = {}): Animals {
  const species = findSpecies(id)
  if (!species) throw new Error(`${id} has left the species facts`)
  const usual = {
    count: 60,
    massG: 2,
    stage: 'fingerling',
    shortestMm: 45,
    longestMm: 52,
    fastedHours: 72,
  } as const
  return { species, ...usual, ...changes }
}

export function bags(changes: Partial<BaggedBoxes> = {}): BaggedBoxes {
  return {
    kind: 'bags',
    boxes: 1,
    bagsPerBox: 1,
    waterLPerBag: 8,
    oxygenLPerBag: 24,
    isDoubled: true,
    standsStill: false,
    box: foamBox,
    packs: { heat: null, cold: null, hasAirHoles: true },
    ...changes,
  }
}

export function bucket(changes: Partial<Vessel> = {}): Vessel {
  const box = { lengthCm: 28, widthCm: 28, heightCm: 30, wallMm: 2.5, conductivityWPerMK: 0.2 }
  return { kind: 'vessel', waterL: 15, box, aeration: 'none', ...changes }
}

/** 24 hours at a steady 15 °C with young hybrid bluegill, unless something else is said. */
export function tripOf(changes: Partial<Trip> = {}): Trip {
  return {
    animals: animals('hybrid_bluegill'),
    water: { startC: 20, alkalinityMeqPerL: 2, pH: 7.5 },
    container: bags(),
    legs: [{ hours: 24, airC: 15 }],
    departHour: 8,
    weather: null,
    ...changes,
  }
}
