import { asks } from '@/components/tools/asks'
import { printFigure } from '@/components/tools/print-figure'
import { oxygenDemandEquation, oxygenDemandMgPerKgHour } from '@/shared/domain/animals/oxygen-demand'
import { oxygenStandIns } from '@/shared/domain/animals/stand-ins.facts'
import { findSpecies } from '@/shared/domain/species/find-species'
import { speciesFacts } from '@/shared/domain/species/species.facts'

import type { Tool } from '@/components/tools/tool'

const known = speciesFacts.filter(({ oxygenModel }) => oxygenModel)

function standIn(speciesId = ''): string {
  const measured = Object.entries(oxygenStandIns).find(([id]) => id === speciesId)?.[1]
  return measured ? `Measured on ${measured}. ` : ''
}

export const oxygenDemand: Tool = {
  id: 'oxygen-demand',
  title: 'How much oxygen fish use',
  lead: 'Fasted and at rest. Small and warm fish use far more for each pound.',
  asks: [asks.massG(), asks.waterC()],
  choosing: [
    {
      id: 'species',
      label: 'Species',
      start: 'nile_tilapia',
      choices: known.map(({ id, commonName }) => ({ value: id, label: commonName })),
    },
  ],
  equations: [oxygenDemandEquation],
  answer({ figures: { massG = 0, waterC = 0 }, chosen }) {
    const model = findSpecies(chosen.species ?? '')?.oxygenModel
    const demand = model ? oxygenDemandMgPerKgHour({ model, massG, waterC }) : null
    if (demand === null) {
      return { refusal: 'It holds for animals of 0.05 g to 5 kg, below the temperature that kills them.' }
    }
    return {
      lines: [
        { label: 'For each kilogram of fish', text: `${printFigure(demand)} mg an hour` },
        { label: 'For each pound of fish', text: `${printFigure(demand * 0.45359237)} mg an hour` },
        { label: 'One of them', text: `${printFigure((demand * massG) / 1000)} mg an hour` },
      ],
      note:
        standIn(chosen.species) +
        'Packed, excited fish are reckoned at one and a half times this; fed fish use up to four times.',
    }
  },
  cautions: ['The factor for packed fish is a house rule. Measure oxygen where lives hang on it.'],
}
