import { asks } from '@/components/tools/asks'
import { printFigure } from '@/components/tools/print-figure'
import { ammoniaCriteria } from '@/shared/domain/water/ammonia-criteria'
import { ammoniaFraction } from '@/shared/domain/water/ammonia-fraction'
import { waterEquations } from '@/shared/domain/water/water-equations.facts'

import type { Tool } from '@/components/tools/tool'

export const ammonia: Tool = {
  id: 'ammonia',
  title: 'Ammonia: how much of it harms',
  lead: 'A test kit shows total ammonia. Only the un-ionised part is toxic, and warm, alkaline water makes more of it.',
  asks: [asks.mgPerL({ id: 'tanMgPerL', label: 'Total ammonia, as nitrogen' }), asks.waterC(), asks.pH()],
  choosing: [
    {
      id: 'trout',
      label: 'Trout or salmon in it?',
      start: 'no',
      choices: [
        { value: 'no', label: 'No' },
        { value: 'yes', label: 'Yes' },
      ],
    },
  ],
  equations: [waterEquations.ammoniaFraction, waterEquations.ammoniaCriteria],
  answer({ figures: { tanMgPerL = 0, waterC = 0, pH = 0 }, chosen }) {
    const fraction = ammoniaFraction({ waterC, pH })
    if (fraction === null || tanMgPerL < 0)
      return { refusal: 'It holds for 32 to 122 °F (0 to 50 °C) and pH 3 to 12.' }
    const limits = ammoniaCriteria({ waterC, pH, trout: chosen.trout === 'yes' })
    return {
      lines: [
        { label: 'Toxic part, as nitrogen', text: `${printFigure(tanMgPerL * fraction)} mg/L` },
        { label: 'Share of the total', text: `${printFigure(fraction * 100)} %` },
        ...(limits
          ? [
              {
                label: 'EPA limit for one hour, total ammonia',
                text: `${printFigure(limits.acuteMgTanPerL)} mg/L`,
              },
              {
                label: 'EPA limit as a 30-day mean, total ammonia',
                text: `${printFigure(limits.chronicMgTanPerL)} mg/L`,
              },
            ]
          : []),
      ],
      note: limits
        ? 'The EPA limits protect wild waters and mussels too: they are strict for a tank.'
        : 'The EPA limits hold for pH 6.5 to 9 and up to 86 °F (30 °C).',
    }
  },
  cautions: [
    'Some kits print NH3 instead of nitrogen: divide by 1.216 first. A kit reads to about a quarter ppm.',
  ],
}
