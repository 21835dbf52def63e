import { z } from 'zod'

import { lengthToMassEquation, standardWeightG } from '@/shared/domain/animals/length-to-mass'
import { oxygenDemandEquation, oxygenDemandMgPerKgHour } from '@/shared/domain/animals/oxygen-demand'
import type { OxygenModelId } from '@/shared/domain/animals/oxygen-models.facts'
import { massAfterG, thermalGrowthEquation } from '@/shared/domain/growth/thermal-growth'
import { findSpecies } from '@/shared/domain/species/find-species'
import { command, named, Refusal, type Command } from '@/scripts/calc/command'

const modelNames = {
  tilapia: 'tilapia-adult',
  bluegill: 'bluegill-juvenile',
  'yellow-perch': 'perch-juvenile',
  'rainbow-trout': 'trout-adult',
  'largemouth-bass': 'bass-adult',
  'striped-bass': 'striped-bass-young',
  bullhead: 'brown-bullhead',
  roach: 'roach',
  fathead: 'fathead',
  crayfish: 'rusty-crayfish',
} as const satisfies Record<string, OxygenModelId>

const model = z.enum(Object.keys(modelNames) as [keyof typeof modelNames])

export const animalCommands: Record<string, Command> = {
  'oxygen-demand': command(
    z.strictObject({ model, massG: z.number(), temperatureC: z.number() }),
    oxygenDemandEquation.validFor,
    ({ model: name, massG, temperatureC }) =>
      named('mgPerKgHour', oxygenDemandMgPerKgHour({ model: modelNames[name], massG, waterC: temperatureC })),
  ),
  'standard-weight': command(
    z.strictObject({ species: z.string(), lengthMm: z.number() }),
    lengthToMassEquation.validFor,
    ({ species, lengthMm }) => {
      const record = findSpecies(species)
      if (!record) throw new Refusal(`species: we hold no figures for "${species}".`)
      if (!record.standardWeight)
        throw new Refusal(`species: nobody published a standard weight for ${species}.`)
      return named('massG', standardWeightG(record.standardWeight, lengthMm))
    },
  ),
  growth: command(
    z.strictObject({ massG: z.number(), tgcX1000: z.number(), temperatureC: z.number(), days: z.number() }),
    thermalGrowthEquation.validFor,
    ({ massG, tgcX1000, temperatureC, days }) =>
      named('massG', massAfterG({ massG, tgcX1000, waterC: temperatureC, days })),
  ),
}
