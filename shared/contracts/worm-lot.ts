import { z } from 'zod'

import {
  askedInt,
  askedLine,
  askedNumber,
  askedState,
  askedWords,
  askedYesNo,
  freeLine,
} from '@/shared/contracts/asked'
import { checkWorms } from '@/shared/contracts/check-worms'
import { wormUnit } from '@/shared/contracts/sale-unit'
import { supplyTerms } from '@/shared/contracts/supply-terms'

const survival = 'No survival promise (0), or 3 to 7 days.'
const wormMm = askedNumber(3, 400, 'A length, like 3 in.')

const promise = z
  .object(
    {
      windowHours: askedInt(4, 24, '4 to 24 hours.'),
      survivalDays: z.union([z.literal(0), z.int(survival).min(3, survival).max(7, survival)], survival),
      remedy: z.enum(['refund', 'replace'], 'A refund, or new worms?'),
      evidence: askedLine(200, 'What should the buyer show you? A photo of the open bag, for instance.'),
    },
    'What do you promise for their arrival?',
  )
  .strict()

/** Composting worms and larvae, by the counted pack or by packed weight. */
const wormFields = z
  .object({
    category: z.literal('worms'),
    taxonId: askedLine(60, 'Pick the worm from the list, genus and species.'),
    strain: freeLine(80),
    grading: z.enum(['bed-run', 'sized'], 'Bed-run (all sizes as they come), or sorted by size?'),
    sizeLoMm: wormMm.optional(),
    sizeHiMm: wormMm.optional(),
    bedding: askedLine(120, 'What are they packed in? Damp peat or coir, for instance.'),
    saleUnit: wormUnit,
    countMethod: z
      .enum(
        ['hand', 'sample-weight', 'displacement'],
        'How do you count: by hand, by a weighed sample, by displacement?',
      )
      .optional(),
    overcountPct: askedInt(0, 15, 'How many extra do you pack, in percent? 0 to 15.'),
    raisedInUs: askedYesNo('Were they raised in the United States? Yes or no.'),
    lotChecked: z.literal(
      true,
      'Look through the lot for jumping worms, also called snake worms or Alabama jumpers, then tick this.',
    ),
    origin: z.enum(['hatched-here', 'grown-on', 'bought-in'], 'Where do they come from?'),
    originState: askedState.optional(),
    wildCaught: z.literal(false, 'Worms dug up or caught in the wild are not listed here.'),
    licenceNumbers: askedWords(300, 'Your licence or permit numbers, or "none needed" and why.'),
    statesServed: z
      .array(askedState, 'Which states do you serve?')
      .min(1, 'Which states do you serve?')
      .max(51, 'Each state once.'),
    promise,
    ...supplyTerms({ least: 10, most: 50, leastFreeHours: 12 }),
  })
  .strict()

export type WormBody = z.output<typeof wormFields>
export const wormBody = wormFields.superRefine((lot, ctx) => {
  checkWorms(lot, (path, message) => ctx.addIssue({ code: 'custom', path, message }))
})
