import { describe, expect, it } from 'vitest'

import { wormBody } from '@/shared/contracts/worm-lot'
import { redWigglers } from '@/shared/domain/listings/lots-for-tests'
import { changeAt, issuesOf, badlyTold, type Path } from '@/shared/contracts/lot-issues-for-tests'

const worms = { ...redWigglers, words: 'The lot was looked through for jumping worms.' }
const told = (...changes: [Path, unknown][]) =>
  issuesOf(
    wormBody,
    changes.reduce<unknown>((body, [path, value]) => changeAt(body, path, value), worms),
  )

describe('a lot of worms as published', () => {
  it('is sold by the counted pack', () => expect(told()).toEqual({}))
  it('or by packed weight, which needs no counting', () =>
    expect(told([['saleUnit'], { kind: 'weight', netG: 453.59237 }], [['countMethod'], undefined])).toEqual(
      {},
    ))
  it('may come from abroad, for an admin to look at', () => expect(told([['raisedInUs'], false])).toEqual({}))
})

const policy = 'We do not list this species. That is our policy for everyone.'
const bad: [string, [Path, unknown][], Record<string, string>][] = [
  ['a jumping worm', [[['taxonId'], 'amynthas']], { taxonId: policy }],
  ['the other genus', [[['taxonId'], 'metaphire']], { taxonId: policy }],
  ['a jumping worm under a trade name', [[['strain'], 'Alabama Jumpers']], { strain: policy }],
  ['a fish', [[['taxonId'], 'bluegill']], { taxonId: 'Pick the worm from the list, genus and species.' }],
  [
    'a lot nobody looked through',
    [[['lotChecked'], false]],
    {
      lotChecked:
        'Look through the lot for jumping worms, also called snake worms or Alabama jumpers, then tick this.',
    },
  ],
  [
    'a pack counted nobody says how',
    [[['countMethod'], undefined]],
    {
      countMethod: 'Sold by count: say how you count, by hand, by a weighed sample or by displacement.',
    },
  ],
  [
    'worms by the head',
    [[['saleUnit'], { kind: 'head' }]],
    {
      'saleUnit.kind': 'Say how much one unit is: a pack of so many worms, or a packed weight like 1 lb.',
    },
  ],
  [
    'a weight without its unit',
    [[['saleUnit'], { kind: 'weight', netG: '1' }]],
    {
      'saleUnit.netG': 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.',
    },
  ],
  [
    'an empty pack',
    [[['saleUnit'], { kind: 'pack', count: 0 }]],
    { 'saleUnit.count': 'How many are in one pack? Like 250.' },
  ],
  [
    'sorted by no size',
    [[['grading'], 'sized']],
    { sizeLoMm: 'Sorted by size: from how long to how long are they?' },
  ],
  [
    'sorted the wrong way round',
    [
      [['grading'], 'sized'],
      [['sizeLoMm'], 90],
      [['sizeHiMm'], 50],
    ],
    {
      sizeHiMm: 'The longest cannot be shorter than the shortest.',
    },
  ],
  ['bought in from nowhere', [[['origin'], 'bought-in']], { originState: 'From which state?' }],
  [
    'dug up in the wild',
    [[['wildCaught'], true]],
    { wildCaught: 'Worms dug up or caught in the wild are not listed here.' },
  ],
  [
    'a price that rises with the count',
    [[['tiers', 1, 'unitCents'], 2500]],
    { 'tiers.1.unitCents': 'The price must fall as the count grows.' },
  ],
  ['a deposit of 5 %', [[['depositPct'], 5]], { depositPct: 'A deposit of 10 to 50 %.' }],
  ['a deposit of 60 %', [[['depositPct'], 60]], { depositPct: 'A deposit of 10 to 50 %.' }],
  [
    'too many extra',
    [[['overcountPct'], 20]],
    { overcountPct: 'How many extra do you pack, in percent? 0 to 15.' },
  ],
  [
    'a buyer who may take less than the least',
    [
      [['minOrder'], 12],
      [['tiers', 0, 'fromCount'], 12],
      [['tiers', 1, 'fromCount'], 20],
    ],
    {
      mostPerBuyer: 'The most for one buyer is below your smallest order.',
    },
  ],
]

describe('bad input of worms', () => {
  it.each(bad)('%s', (_what, changes, expected) => expect(told(...changes)).toEqual(expected))
  it('is answered in sentences, whatever is missing or of the wrong kind', () => {
    const { told: complaints, bad } = badlyTold(wormBody, worms)
    expect(complaints).toBeGreaterThan(200)
    expect(bad).toEqual([])
  })
})
