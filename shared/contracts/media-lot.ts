import { z } from 'zod'

import { askedNumber, askedYesNo, freeLine, freeWords } from '@/shared/contracts/asked'
import { checkMedia } from '@/shared/contracts/check-media'
import { mediaUnit } from '@/shared/contracts/sale-unit'
import { supplyTerms } from '@/shared/contracts/supply-terms'
import { mediaIds } from '@/shared/domain/media/media.facts'
import { heatAnswers } from '@/shared/domain/worms/heat-treated'

const grainMm = askedNumber(0.1, 200, 'A grain size, like 10 mm or 3/8 in.')

/** What fills a bed: clay, rock, gravel, coir; castings and compost too. */
const mediaFields = z
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

export type MediaBody = z.output<typeof mediaFields>
export const mediaBody = mediaFields.superRefine((lot, ctx) => {
  checkMedia(lot, (path, message) => ctx.addIssue({ code: 'custom', path, message }))
})
