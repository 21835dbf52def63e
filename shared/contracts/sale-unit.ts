import { z } from 'zod'

import { askedInt, askedNumber } from '@/shared/contracts/asked'

const weighed = 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.'
const netG = askedNumber(1, 1_000_000, weighed)

const each = z.object({ kind: z.literal('each') }).strict()
const head = z.object({ kind: z.literal('head') }).strict()
const dryPint = z.object({ kind: z.literal('dry-pint') }).strict()
const bunch = z.object({ kind: z.literal('bunch'), netG: netG.optional() }).strict()
const weight = z.object({ kind: z.literal('weight'), netG }).strict()
const pack = z
  .object({ kind: z.literal('pack'), count: askedInt(1, 100_000, 'How many are in one pack? Like 250.') })
  .strict()
const volume = z
  .object({
    kind: z.literal('volume'),
    litres: askedNumber(0.5, 5000, 'How much fills one unit? A volume, like 50 L or 1.8 cu ft.'),
    weightKg: askedNumber(0.05, 5000, 'What does one unit weigh? Buyers carry it: like 14 kg or 31 lb.'),
  })
  .strict()

/** A bag or a box alone is no measure, so none of these is one. */
export const produceUnit = z.discriminatedUnion('kind', [weight, bunch, head, each, dryPint], {
  error:
    'Say how much one unit is: a net weight, a bunch, a head, a piece or a dry pint. A bag or a box alone does not say it.',
})
export const wormUnit = z.discriminatedUnion('kind', [pack, weight], {
  error: 'Say how much one unit is: a pack of so many worms, or a packed weight like 1 lb.',
})
export const mediaUnit = z.discriminatedUnion('kind', [volume, weight], {
  error:
    'Say how much one unit is: its volume and what it weighs, or a net weight. A bag alone does not say it.',
})
