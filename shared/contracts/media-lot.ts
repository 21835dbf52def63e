import { z } from 'zod'

import { askedNumber, askedYesNo, freeLine, freeWords } from '@/shared/contracts/asked'
import { checkStock, checkWindows, type Wrong } from '@/shared/contracts/check-lot'
import { mediaUnit } from '@/shared/contracts/sale-unit'
import { supplyTerms } from '@/shared/contracts/supply-terms'
import { findMedia } from '@/shared/domain/media/find-media'
import { mediaIds } from '@/shared/domain/media/media.facts'
import { heatAnswers } from '@/shared/domain/worms/heat-treated'

const grainMm = askedNumber(0.1, 200, 'A grain size, like 10 mm or 3/8 in.')

/** What fills a bed: clay, rock, gravel, coir; castings and compost too. */
export const mediaBody = z
  .object({
    category: z.literal('media'),
    material: z.enum(mediaIds, 'Pick the material from the list.'),
    materialWords: freeLine(80),
    saleUnit: mediaUnit,
    grainLoMm: grainMm.optional(),
    grainHiMm: grainMm.optional(),
    rinsed: askedYesNo('Is it rinsed? Yes or no.').optional(),
    vinegarTest: z
      .enum(['no-fizz', 'fizzes', 'not-done'], 'What does a handful do in vinegar? "Not done" is an answer.')
      .optional(),
    used: z.enum(['new', 'used'], 'New, or used before?'),
    usedWords: freeWords(400),
    heatTreated: z.enum(heatAnswers, 'Was it heat treated? "Unknown" is an answer.').optional(),
    ...supplyTerms({ least: 0, most: 30, leastFreeHours: 12 }),
  })
  .strict()
  .superRefine((lot, ctx) => {
    const wrong: Wrong = (path, message) => ctx.addIssue({ code: 'custom', path, message })
    const material = findMedia(lot.material)
    if (lot.material === 'other' && !lot.materialWords) {
      wrong(['materialWords'], 'What is it? Name the material in a few words.')
    }
    if (material?.hasGrain) {
      if (lot.grainLoMm === undefined) wrong(['grainLoMm'], 'The finest grain, like 8 mm or 1/4 in.')
      if (lot.grainHiMm === undefined) wrong(['grainHiMm'], 'The coarsest grain, like 16 mm or 5/8 in.')
      if (lot.rinsed === undefined) wrong(['rinsed'], 'Is it rinsed? Yes or no.')
      if (!lot.vinegarTest) {
        wrong(['vinegarTest'], 'Drop a handful in vinegar: does it fizz? "Not done" is an answer.')
      }
    }
    if ((lot.grainHiMm ?? Infinity) < (lot.grainLoMm ?? 0)) {
      wrong(['grainHiMm'], 'The coarsest grain cannot be finer than the finest.')
    }
    if (material?.mayCarryWorms && !lot.heatTreated) {
      wrong(
        ['heatTreated'],
        'Was it heat treated, so that no worm or egg lives in it? "Unknown" is an answer.',
      )
    }
    if (lot.used === 'used' && !lot.usedWords) {
      wrong(['usedWords'], 'Used in what? Say what lived in it, and any salt, copper or medicine.')
    }
    checkStock(lot, wrong)
    checkWindows(lot, wrong)
  })
export type MediaBody = z.output<typeof mediaBody>
