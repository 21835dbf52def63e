import { renderPackingSheet } from '@/server/packing/packing-sheet'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { makePackingSheet as call } from '@/shared/contracts/packing'
import { findSpecies } from '@/shared/domain/species/find-species'
import { usualBags, usualBoxes } from '@/shared/domain/transport/packing.facts'
import { packingSheet } from '@/shared/domain/transport/packing-sheet'
import { planPacking, type PackingTask } from '@/shared/domain/transport/plan-packing'
import { reasonTexts } from '@/shared/domain/transport/reason-texts.facts'

type Asked = ParsedBody<typeof call>

/** Plans the packing and prints it; refuses with the reasons where no packing at hand is safe. */
export async function makePackingSheet(asked: Asked): Promise<Uint8Array<ArrayBuffer>> {
  const task = taskOf(asked)
  const answer = planPacking(task)
  if (!answer.plan) {
    const because = answer.because.map(({ code }) => reasonTexts[code].text).join(' ')
    throw new Problem('trip-unsafe', `No packing from this list is safe. ${because}`.trim())
  }
  return renderPackingSheet(packingSheet(task, answer.plan))
}

function taskOf(asked: Asked): PackingTask {
  const species = findSpecies(asked.species)
  if (!species) {
    const detail = 'We hold no figures for this animal. Choose one from the list.'
    throw new Problem('fields-invalid', undefined, { errors: [{ detail, pointer: '#/species' }] })
  }
  const { count, massG, stage, shortestMm, longestMm, fastedHours } = asked
  const { startC, alkalinityMeqPerL, pH, legs, departHour, weather, standsStill } = asked
  return {
    animals: { species, count, massG, stage, shortestMm, longestMm, fastedHours },
    water: { startC, alkalinityMeqPerL, pH },
    legs,
    departHour,
    weather,
    standsStill,
    boxSizes: asked.boxSizes ?? usualBoxes,
    bagSizes: asked.bagSizes ?? usualBags,
  }
}
