import { describe, expect, it } from 'vitest'

import { produceBody } from '@/shared/contracts/produce-lot'
import { lettuce } from '@/shared/contracts/lettuce-for-tests'
import { changeAt, issuesOf, badlyTold, type Path } from '@/shared/contracts/lot-issues-for-tests'

const farm = { name: 'Willow Run', street: '12 Mill Rd', city: 'Oxford', state: 'OH', zip: '45056' }
const told = (...changes: [Path, unknown][]) =>
  issuesOf(
    produceBody,
    changes.reduce<unknown>((body, [path, value]) => changeAt(body, path, value), lettuce),
  )

describe('a harvest as published', () => {
  it('is the lettuce of one evening, without a ruler in the photo', () => expect(told()).toEqual({}))

  it('may be kale by the bunch, with its weight', () =>
    expect(told([['cropId'], 'kale'], [['saleUnit'], { kind: 'bunch', netG: 170 }])).toEqual({}))

  it('may be a larger order with a part paid first', () =>
    expect(told([['minOrder'], 14], [['depositPct'], 25])).toEqual({}))

  it('may be sold by a qualified exempt farm that shows where it is', () =>
    expect(told([['standing'], 'qualified-exempt'], [['farm'], farm])).toEqual({}))

  it('leaves water spinach to the species gate', () =>
    expect(
      told(
        [['cropId'], 'water_spinach'],
        [['saleUnit'], { kind: 'weight', netG: 250 }],
        [['sellBy'], '2027-04-14'],
      ),
    ).toEqual({}))
})

const bad: [string, [Path, unknown][], Record<string, string>][] = [
  [
    'G-A2 cut greens in a warm box',
    [
      [['form'], 'cut-mixed-or-washed'],
      [['handling', 'heldC'], 8],
      [['sellBy'], '2027-04-14'],
    ],
    {
      'handling.heldC':
        'Cut leafy greens are kept at 41 °F (5 °C) or colder, from the cutting to the hand-over.',
    },
  ],
  [
    'G-A2 cut greens without a cooler',
    [
      [['form'], 'cut-mixed-or-washed'],
      [['handling', 'coldAtPickup'], false],
      [['sellBy'], '2027-04-14'],
    ],
    {
      'handling.coldAtPickup': 'Cut leafy greens are handed over from a cooler or fridge.',
    },
  ],
  [
    'G-A3 a name that is no crop of the list',
    [[['cropId'], 'kangkong']],
    {
      cropId: 'Pick the crop from the list. Is yours missing? Ask us to add it.',
    },
  ],
  [
    'A6.6 sprouts as the crop',
    [[['cropId'], 'alfalfa sprouts']],
    { cropId: expect.stringContaining('Sprouts are not sold here') as string },
  ],
  [
    'G-A4 kale per bag',
    [
      [['cropId'], 'kale'],
      [['saleUnit'], { kind: 'bag' }],
    ],
    {
      'saleUnit.kind':
        'Say how much one unit is: a net weight, a bunch, a head, a piece or a dry pint. A bag or a box alone does not say it.',
    },
  ],
  [
    'G-A4 kale by a bare bunch',
    [
      [['cropId'], 'kale'],
      [['saleUnit'], { kind: 'bunch' }],
    ],
    {
      saleUnit: 'Kale: bunches differ, so write the least net weight of one bunch too, like 6 oz.',
    },
  ],
  [
    'G-A4 kale by the head',
    [[['cropId'], 'kale']],
    {
      saleUnit: 'Kale: sell by the bunch with its net weight or by net weight.',
    },
  ],
  [
    'a weight without its unit',
    [[['saleUnit'], { kind: 'weight', netG: '8' }]],
    {
      'saleUnit.netG': 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.',
    },
  ],
  [
    'a weight that is missing',
    [[['saleUnit'], { kind: 'weight' }]],
    {
      'saleUnit.netG': 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.',
    },
  ],
  [
    'no unit at all',
    [[['saleUnit'], undefined]],
    {
      saleUnit:
        'Say how much one unit is: a net weight, a bunch, a head, a piece or a dry pint. A bag or a box alone does not say it.',
    },
  ],
  [
    'G-A9 qualified exempt without an address',
    [[['standing'], 'qualified-exempt']],
    {
      farm: 'A qualified exempt farm shows its name and full business address to buyers. Give both, or choose another answer.',
    },
  ],
  [
    'G-A9 an address that nobody needs to see',
    [[['farm'], farm]],
    {
      farm: 'Your address would be public without need: leave it out, or choose "qualified exempt".',
    },
  ],
  [
    'G-A10 organic in the variety',
    [[['variety'], 'Organic Salanova']],
    { variety: expect.stringContaining('grown without synthetic pesticides') as string },
  ],
  [
    'G-A10 organic under a photo',
    [[['photos', 0, 'caption'], 'our ORGANIC lettuce']],
    { 'photos.0.caption': expect.stringContaining('"Organic"') as string },
  ],
  [
    'certified by nobody',
    [[['organic'], 'certified']],
    { organicCertifier: 'Who certified you? Name the certifier, or take the claim back.' },
  ],
  [
    'ready to eat, but whole',
    [[['words'], 'Ready-to-eat heads']],
    { words: expect.stringContaining('food licence') as string },
  ],
  [
    'sprouts',
    [[['words'], 'with alfalfa sprouts']],
    { words: expect.stringContaining('Microgreens are fine') as string },
  ],
  [
    'a price that rises with the count',
    [
      [
        ['tiers'],
        [
          { fromCount: 1, unitCents: 300 },
          { fromCount: 5, unitCents: 320 },
        ],
      ],
    ],
    {
      'tiers.1.unitCents': 'The price must fall as the count grows.',
    },
  ],
  [
    'a price that stays',
    [
      [
        ['tiers'],
        [
          { fromCount: 1, unitCents: 300 },
          { fromCount: 5, unitCents: 300 },
        ],
      ],
    ],
    {
      'tiers.1.unitCents': 'The price must fall as the count grows.',
    },
  ],
  [
    'a price in broken cents',
    [[['tiers', 0, 'unitCents'], 2.5]],
    { 'tiers.0.unitCents': 'A price for one unit, in dollars and cents.' },
  ],
  [
    'no price',
    [[['tiers', 0, 'unitCents'], 0]],
    { 'tiers.0.unitCents': 'A price for one unit, at least one cent.' },
  ],
  [
    'small orders with a part paid first',
    [[['depositPct'], 25]],
    { depositPct: 'Produce orders under $40 are paid in full: set the deposit to 100 %.' },
  ],
  [
    'more in the smallest order than there is',
    [[['minOrder'], 20]],
    { minOrder: 'The smallest order is more than you have.' },
  ],
  [
    'a pickup after it is good',
    [[['windows', 0, 'day'], '2027-04-20']],
    { 'windows.0.day': 'This pickup is after the last day of sale, 2027-04-19.' },
  ],
  [
    'a pickup before the harvest',
    [[['windows', 0, 'day'], '2027-04-11']],
    { 'windows.0.day': 'This pickup is before the harvest.' },
  ],
  [
    'a window that ends before it starts',
    [[['windows', 0, 'until'], '16:00']],
    { 'windows.0.until': 'The window must end after it starts.' },
  ],
  [
    'a last day later than it is good',
    [[['sellBy'], '2027-05-01']],
    { sellBy: 'Kept like this it is good until 2027-04-19. Choose that day or an earlier one.' },
  ],
  [
    'a last day before the harvest',
    [[['sellBy'], '2027-04-11']],
    expect.objectContaining({ sellBy: 'The last day of sale cannot be before the harvest.' }) as Record<
      string,
      string
    >,
  ],
  [
    'a temperature nobody measured a life at',
    [[['handling', 'heldC'], 20]],
    { sellBy: 'Nobody published how long it keeps like this. Say until which day you sell it.' },
  ],
  [
    'a lot code of another day',
    [[['lotCode'], 'L-0413']],
    { lotCode: 'The lot code names another day than the harvest. Leave it empty and we write one.' },
  ],
  [
    'a lot code of another make',
    [[['lotCode'], 'LOT 7']],
    { lotCode: 'A lot code like L-0412 or L-0412-B3. Leave it empty and we write one.' },
  ],
  ['no photo', [[['photos'], []]], { photos: 'At least one photo of what you sell.' }],
  [
    'a farm in no state',
    [
      [['standing'], 'qualified-exempt'],
      [['farm'], { ...farm, state: 'Ohio' }],
    ],
    { 'farm.state': 'Two letters, like OH.' },
  ],
]

describe('bad input of a harvest', () => {
  it.each(bad)('%s', (_what, changes, expected) => expect(told(...changes)).toEqual(expected))

  it('is answered in sentences, whatever is missing or of the wrong kind', () => {
    const { told: complaints, bad } = badlyTold(produceBody, lettuce)
    expect(complaints).toBeGreaterThan(200)
    expect(bad).toEqual([])
  })
})
