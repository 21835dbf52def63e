import { asks } from '@/components/tools/asks'
import { printFigure } from '@/components/tools/print-figure'
import { bagLoadGPerL } from '@/shared/domain/transport/bag-loading'
import { bagTable, type BagStage } from '@/shared/domain/transport/bag-loading.facts'
import { fahrenheitFromC } from '@/shared/units/temperature'

import type { Tool } from '@/components/tools/tool'

const LITRES_OF_BAG_WATER = 7.5

const stages: readonly { value: BagStage; label: string }[] = [
  { value: 'fingerling', label: 'Fingerlings' },
  { value: 'swim-up-fry', label: 'Fry that swim up and eat' },
  { value: 'yolk-sac-fry', label: 'Fry with a yolk sac' },
  { value: 'eggs', label: 'Eggs' },
]

export const bagLoading: Tool = {
  id: 'bag-loading',
  title: 'How much a bag with oxygen holds',
  lead: 'The published loading table at its cautious end, for the hours and the water you have.',
  asks: [asks.hours(), asks.waterC({ start: { us: '65', metric: '18' } })],
  choosing: [{ id: 'stage', label: 'What travels', start: 'fingerling', choices: stages }],
  equations: [
    {
      text: 'g/L = lb/gal of the table × 119.8, straight between its columns, corrected for warmth',
      validFor: '1 to 48 hours, water of 32 to 100 °F, one part of water to two or three of oxygen',
      sourceKeys: ['dupree-huner-1984'],
    },
  ],
  answer({ figures: { hours = 0, waterC = 0 }, chosen }) {
    const stage = (chosen.stage ?? '') as BagStage
    const load = stage in bagTable ? bagLoadGPerL({ stage, hours, waterF: fahrenheitFromC(waterC) }) : null
    if (load === null) {
      return { refusal: 'The table ends at 48 hours, and at 32 to 100 °F (0 to 38 °C). Nobody knows beyond.' }
    }
    return {
      lines: [
        { label: 'At most', text: `${printFigure(load)} g of fish per litre` },
        {
          label: 'In 2 gallons (7.5 L) of bag water',
          text: `${printFigure(load * LITRES_OF_BAG_WATER)} g of fish`,
        },
      ],
      note: 'The trip check also reckons oxygen, carbon dioxide and ammonia; the stricter of the two holds.',
    }
  },
  cautions: ['For fasted fish without spines, graded to one size, in clean water of their own temperature.'],
}
