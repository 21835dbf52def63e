import { commonRules, kindOf, netWeight } from './common-rules'
import { free, freeText, number, oneOf, yesNo, type LotRule } from './lot-shape'

import { mediaIds } from '@/shared/domain/media/media.facts'
import { heatAnswers } from '@/shared/domain/worms/heat-treated'

const grain = 'A grain size, like 10 mm or 3/8 in.'
const isVolume: LotRule['when'] = ({ saleUnit }) => kindOf(saleUnit) === 'volume'

export const mediaRules: readonly LotRule[] = [
  { path: 'material', fits: oneOf(mediaIds), ask: 'Pick the material from the list.' },
  { path: 'materialWords', fits: freeText(80), ask: 'At most 80 characters.' },
  { path: 'grainLoMm', fits: free(number(0.1, 200)), ask: grain },
  { path: 'grainHiMm', fits: free(number(0.1, 200)), ask: grain },
  { path: 'rinsed', fits: free(yesNo), ask: 'Is it rinsed? Yes or no.' },
  {
    path: 'vinegarTest',
    fits: free(oneOf(['no-fizz', 'fizzes', 'not-done'])),
    ask: 'What does a handful do in vinegar? "Not done" is an answer.',
  },
  {
    path: 'heatTreated',
    fits: free(oneOf(heatAnswers)),
    ask: 'Was it heat treated? "Unknown" is an answer.',
  },
  { path: 'used', fits: oneOf(['new', 'used']), ask: 'New, or used before?' },
  { path: 'usedWords', fits: freeText(400), ask: 'At most 400 characters.' },
  {
    path: 'saleUnit.kind',
    fits: oneOf(['volume', 'weight']),
    ask: 'Say how much one unit is: its volume and what it weighs, or a net weight. A bag alone does not say it.',
  },
  {
    path: 'saleUnit.litres',
    fits: number(0.5, 5000),
    ask: 'How much fills one unit? A volume, like 50 L or 1.8 cu ft.',
    when: isVolume,
  },
  {
    path: 'saleUnit.weightKg',
    fits: number(0.05, 5000),
    ask: 'What does one unit weigh? Buyers carry it: like 14 kg or 31 lb.',
    when: isVolume,
  },
  netWeight,
  ...commonRules({ least: 0, most: 30, leastFreeHours: 12 }),
]
