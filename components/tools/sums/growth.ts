import { asks } from '@/components/tools/asks'
import { massForLoadG } from '@/shared/domain/animals/length-to-mass'
import { forecastGrowth } from '@/shared/domain/growth/forecast-growth'
import { thermalGrowthEquation } from '@/shared/domain/growth/thermal-growth'
import { findSpecies } from '@/shared/domain/species/find-species'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { printLength } from '@/shared/units/length'
import { printMass } from '@/shared/units/mass'

import type { Tool } from '@/components/tools/tool'

const growing = speciesFacts.filter(({ tgcX1000, lengthWeight }) => tgcX1000 && lengthWeight)

export const growth: Tool = {
  id: 'growth',
  title: 'How large they are by then',
  lead: 'From the length today, the temperature of your water and the days, with the slow and the fast end of what was measured.',
  asks: [asks.lengthMm({ start: { us: '3', metric: '7.5' } }), asks.waterC(), asks.days()],
  choosing: [
    {
      id: 'species',
      label: 'Species',
      start: 'bluegill',
      choices: growing.map(({ id, commonName }) => ({ value: id, label: commonName })),
    },
  ],
  equations: [thermalGrowthEquation],
  answer({ figures: { lengthMm = 0, waterC = 0, days = 0 }, chosen, units }) {
    const record = findSpecies(chosen.species ?? '')
    const massG = record && massForLoadG(record, lengthMm)
    const grown = massG && forecastGrowth({ species: record, massG, lengthMm, waterC, days })
    if (!grown) {
      return {
        refusal: 'At this temperature the species hardly feeds, or a figure is outside what was measured.',
      }
    }
    const { slow, fast } = grown
    return {
      lines: [
        {
          label: 'Length',
          text: `${printLength(slow.lengthMm / 10, units)} to ${printLength(fast.lengthMm / 10, units)}`,
        },
        { label: 'Weight', text: `${printMass(slow.massG, units)} to ${printMass(fast.massG, units)}` },
        { label: 'Weight today, reckoned', text: printMass(massG, units) },
      ],
      note: 'Feed, crowding and oxygen decide where between the two they end.',
    }
  },
  cautions: ['A forecast for one steady temperature. Colder nights slow it; too warm stops it.'],
}
