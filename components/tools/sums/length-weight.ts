import { asks } from '@/components/tools/asks'
import { lengthToMassEquation, massForLoadG } from '@/shared/domain/animals/length-to-mass'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { findSpecies } from '@/shared/domain/species/find-species'
import { printMass } from '@/shared/units/mass'

import type { Tool } from '@/components/tools/tool'

const weighable = speciesFacts.filter(({ lengthWeight, standardWeight }) => lengthWeight ?? standardWeight)

export const lengthWeight: Tool = {
  id: 'length-weight',
  title: 'What a fish of this length weighs',
  lead: 'Bags, boxes and tanks are loaded by weight, and fish are sold by length. The heaviest published rule is taken.',
  asks: [asks.lengthMm()],
  choosing: [
    {
      id: 'species',
      label: 'Species',
      start: 'bluegill',
      choices: weighable.map(({ id, commonName }) => ({ value: id, label: commonName })),
    },
  ],
  equations: [lengthToMassEquation],
  answer({ figures: { lengthMm = 0 }, chosen, units }) {
    const record = findSpecies(chosen.species ?? '')
    const massG = record && massForLoadG(record, lengthMm)
    if (!massG) return { refusal: 'Nobody published a rule for this animal at this length.' }
    return {
      lines: [
        { label: 'One weighs about', text: printMass(massG, units) },
        { label: 'A hundred of them', text: printMass(massG * 100, units) },
      ],
      note: 'Fish of one length differ by a quarter and more. Weigh ten of yours to know.',
    }
  },
  cautions: [
    'Standard weights are of wild fish in good condition, from the shortest length of each rule on.',
  ],
}
