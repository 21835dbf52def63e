import { z } from 'zod'

import {
  askedDay,
  askedLine,
  askedNumber,
  askedTime,
  askedWords,
  askedYesNo,
  freeLine,
} from '@/shared/contracts/asked'
import { checkProduce } from '@/shared/contracts/check-produce'
import { produceUnit } from '@/shared/contracts/sale-unit'
import { supplyTerms } from '@/shared/contracts/supply-terms'
import { farmStandings } from '@/shared/domain/produce/farm-standing'
import { waterTouches } from '@/shared/domain/produce/judge-holding'
import { produceForms } from '@/shared/domain/produce/judge-form'
import { readLotCode } from '@/shared/domain/produce/lot-code'

const harvest = z
  .object(
    {
      day: askedDay('On which day is it harvested?'),
      time: askedTime('At what time is it harvested? Like 07:30.'),
      bed: freeLine(20),
    },
    'When is it harvested? A day and a time.',
  )
  .strict()

/** How the harvest met water and cold: what fish water can carry is washed off or kept off. */
const handling = z
  .object(
    {
      touchesSystemWater: z.enum(
        waterTouches,
        'Does fish water touch the part that is eaten? "Not sure" is an answer.',
      ),
      rinsedInDrinkingWater: askedYesNo('Is it rinsed in drinking water? Yes or no.'),
      heldC: askedNumber(-1, 35, 'How cold do you keep it until the pickup? Like 38 °F.'),
      coldAtPickup: askedYesNo('Is it handed over from a cooler or fridge? Yes or no.'),
    },
    'How is it washed and kept?',
  )
  .strict()

const farm = z
  .object(
    {
      name: askedLine(120, 'The name of the farm.'),
      street: askedLine(120, 'Street and number of the farm.'),
      city: askedLine(80, 'The town.'),
      state: z.string('Two letters, like OH.').regex(/^[A-Z]{2}$/, 'Two letters, like OH.'),
      zip: z.string('Five digits, please.').regex(/^\d{5}$/, 'Five digits, please.'),
    },
    'Name and full address of the farm.',
  )
  .strict()

/** A harvest: one crop, one form, one method of sale, one lot. */
const produceFields = z
  .object({
    category: z.literal('produce'),
    cropId: askedLine(60, 'Pick the crop from the list.'),
    variety: freeLine(80),
    form: z.enum(produceForms, 'Whole, leaves cut at the harvest, or cut, mixed or washed ready to eat?'),
    saleUnit: produceUnit,
    harvest,
    /** Left out: the server gives the next free one. */
    lotCode: z
      .string('A lot code like L-0412. Leave it empty and we write one.')
      .refine(
        (code) => readLotCode(code) !== null,
        'A lot code like L-0412 or L-0412-B3. Leave it empty and we write one.',
      )
      .optional(),
    /** Left out: reckoned from crop, harvest and temperature. */
    sellBy: askedDay('Until which day do you sell it?').optional(),
    handling,
    growing: askedWords(400, 'How do you grow it? In your own words.'),
    organic: z
      .enum(['certified', 'exempt-small'], 'Certified organic, or exempt as a small farm?')
      .optional(),
    organicCertifier: freeLine(120),
    standing: z.enum(
      farmStandings,
      'What does the produce safety rule say of your farm? "Don\'t know" is an answer.',
    ),
    farm: farm.optional(),
    ...supplyTerms({ least: 10, most: 100, leastFreeHours: 1 }),
  })
  .strict()

export type ProduceBody = z.output<typeof produceFields>
export const produceBody = produceFields.superRefine((lot, ctx) => {
  checkProduce(lot, (path, message) => ctx.addIssue({ code: 'custom', path, message }))
})
