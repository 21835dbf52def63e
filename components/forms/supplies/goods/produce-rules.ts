import { bunchWeight, commonRules, netWeight } from './common-rules'
import { day, free, freeText, number, oneOf, text, time, yesNo, type LotRule } from './lot-shape'

import { farmStandings } from '@/shared/domain/produce/farm-standing'
import { produceForms } from '@/shared/domain/produce/judge-form'
import { waterTouches } from '@/shared/domain/produce/judge-holding'

/** In the order in which the form asks. */
export const produceRules: readonly LotRule[] = [
  { path: 'cropId', fits: text(60), ask: 'Pick the crop from the list.' },
  { path: 'variety', fits: freeText(80), ask: 'At most 80 characters.' },
  {
    path: 'form',
    fits: oneOf(produceForms),
    ask: 'Whole, leaves cut at the harvest, or cut, mixed or washed ready to eat?',
  },
  {
    path: 'saleUnit.kind',
    fits: oneOf(['weight', 'bunch', 'head', 'each', 'dry-pint']),
    ask: 'Say how much one unit is: a net weight, a bunch, a head, a piece or a dry pint. A bag or a box alone does not say it.',
  },
  netWeight,
  bunchWeight,
  { path: 'harvest.day', fits: day, ask: 'On which day is it harvested?' },
  { path: 'harvest.time', fits: time, ask: 'At what time is it harvested? Like 07:30.' },
  { path: 'harvest.bed', fits: freeText(20), ask: 'At most 20 characters.' },
  { path: 'sellBy', fits: free(day), ask: 'Until which day do you sell it?' },
  {
    path: 'handling.heldC',
    fits: number(-1, 35),
    ask: 'How cold do you keep it until the pickup? Like 38 °F.',
  },
  {
    path: 'handling.touchesSystemWater',
    fits: oneOf(waterTouches),
    ask: 'Does fish water touch the part that is eaten? "Not sure" is an answer.',
  },
  {
    path: 'handling.rinsedInDrinkingWater',
    fits: yesNo,
    ask: 'Is it rinsed in drinking water? Yes or no.',
  },
  {
    path: 'handling.coldAtPickup',
    fits: yesNo,
    ask: 'Is it handed over from a cooler or fridge? Yes or no.',
  },
  { path: 'growing', fits: text(400), ask: 'How do you grow it? In your own words.' },
  {
    path: 'standing',
    fits: oneOf(farmStandings),
    ask: 'What does the produce safety rule say of your farm? "Don\'t know" is an answer.',
  },
  ...commonRules({ least: 10, most: 100, leastFreeHours: 1 }),
]
