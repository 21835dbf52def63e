import { asks } from '@/components/tools/asks'
import { printFigure } from '@/components/tools/print-figure'
import { saltForNitriteMgPerL } from '@/shared/domain/water/salt-for-nitrite'
import { waterEquations } from '@/shared/domain/water/water-equations.facts'
import { printMass } from '@/shared/units/mass'

import type { Tool } from '@/components/tools/tool'

export const nitriteSalt: Tool = {
  id: 'nitrite-salt',
  title: 'Salt against nitrite',
  lead: 'Chloride keeps nitrite out of the gills. This says how much plain salt makes ten parts of chloride for each part of nitrite.',
  asks: [
    asks.mgPerL({ id: 'nitriteMgNPerL', label: 'Nitrite, as nitrogen' }),
    asks.mgPerL({
      id: 'chlorideMgPerL',
      label: 'Chloride in it already',
      start: { us: '20', metric: '20' },
    }),
    asks.volumeL(),
  ],
  equations: [waterEquations.saltForNitrite],
  answer({ figures: { nitriteMgNPerL = 0, chlorideMgPerL = 0, volumeL = 0 }, units }) {
    const perL = saltForNitriteMgPerL({ nitriteMgNPerL, chlorideMgPerL })
    if (perL === null || volumeL <= 0) return { refusal: 'Figures below zero cannot be measured.' }
    if (perL === 0) {
      return {
        lines: [{ label: 'Salt to add', text: 'none' }],
        note: 'There is chloride enough for this nitrite.',
      }
    }
    return {
      lines: [
        { label: 'Salt to add', text: printMass((perL * volumeL) / 1000, units) },
        { label: 'That makes the water saltier by', text: `${printFigure(perL / 1000)} ppt` },
      ],
      note: 'Dissolve it first, and add it over several hours. Then find what makes the nitrite.',
    }
  },
  cautions: [
    'Salt does not protect largemouth bass. Beans, strawberries and other bed plants suffer from it.',
    'Only plain salt, without iodine or anti-caking agents. It treats the sign, not the cause.',
  ],
}
