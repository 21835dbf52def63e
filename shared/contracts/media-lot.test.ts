import { describe, expect, it } from 'vitest'

import { mediaBody } from '@/shared/contracts/media-lot'
import { clay as usedClay } from '@/shared/domain/listings/lots-for-tests'
import { changeAt, issuesOf, badlyTold, type Path } from '@/shared/contracts/lot-issues-for-tests'

const clay = {
  ...usedClay,
  tiers: [
    { fromCount: 1, unitCents: 4000 },
    { fromCount: 5, unitCents: 3500 },
  ],
}
const told = (...changes: [Path, unknown][]) =>
  issuesOf(
    mediaBody,
    changes.reduce<unknown>((body, [path, value]) => changeAt(body, path, value), clay),
  )
const mineral: [Path, unknown][] = (['grainLoMm', 'grainHiMm', 'rinsed', 'vinegarTest'] as const).map(
  (field) => [[field], undefined],
)

describe('media as published', () => {
  it('is sold by a volume that says its weight', () => expect(told()).toEqual({}))
  it('or by weight', () => expect(told([['saleUnit'], { kind: 'weight', netG: 22_680 }])).toEqual({}))
  it('is not refused for a weight that looks wrong: the form asks', () =>
    expect(told([['saleUnit'], { kind: 'volume', litres: 50, weightKg: 80 }])).toEqual({}))
  it('asks castings for heat, not for grain and vinegar', () =>
    expect(told(...mineral, [['material'], 'worm_castings'], [['heatTreated'], 'unknown'])).toEqual({}))
})

const unit =
  'Say how much one unit is: its volume and what it weighs, or a net weight. A bag alone does not say it.'
const bad: [string, [Path, unknown][], Record<string, string>][] = [
  ['by the bag alone', [[['saleUnit'], { kind: 'bag' }]], { 'saleUnit.kind': unit }],
  ['by nothing', [[['saleUnit'], undefined]], { saleUnit: unit }],
  [
    'a volume that nobody weighed',
    [[['saleUnit'], { kind: 'volume', litres: 50 }]],
    {
      'saleUnit.weightKg': 'What does one unit weigh? Buyers carry it: like 14 kg or 31 lb.',
    },
  ],
  [
    'a volume without its unit',
    [[['saleUnit'], { kind: 'volume', litres: '50', weightKg: 14 }]],
    {
      'saleUnit.litres': 'How much fills one unit? A volume, like 50 L or 1.8 cu ft.',
    },
  ],
  [
    'a weight without its unit',
    [[['saleUnit'], { kind: 'weight', netG: '50' }]],
    {
      'saleUnit.netG': 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.',
    },
  ],
  [
    'clay of no grain',
    mineral,
    {
      grainLoMm: 'The finest grain, like 8 mm or 1/4 in.',
      grainHiMm: 'The coarsest grain, like 16 mm or 5/8 in.',
      rinsed: 'Is it rinsed? Yes or no.',
      vinegarTest: 'Drop a handful in vinegar: does it fizz? "Not done" is an answer.',
    },
  ],
  [
    'grain the wrong way round',
    [[['grainHiMm'], 4]],
    { grainHiMm: 'The coarsest grain cannot be finer than the finest.' },
  ],
  [
    'castings that nobody asked about heat',
    [[['material'], 'worm_castings']],
    {
      heatTreated: 'Was it heat treated, so that no worm or egg lives in it? "Unknown" is an answer.',
    },
  ],
  [
    'something without a name',
    [
      [['material'], 'other'],
      [['heatTreated'], 'no'],
    ],
    { materialWords: 'What is it? Name the material in a few words.' },
  ],
  [
    'used in nobody says what',
    [[['usedWords'], undefined]],
    { usedWords: 'Used in what? Say what lived in it, and any salt, copper or medicine.' },
  ],
  [
    'a price that rises with the count',
    [[['tiers', 1, 'unitCents'], 4100]],
    { 'tiers.1.unitCents': 'The price must fall as the count grows.' },
  ],
  ['a deposit of 40 %', [[['depositPct'], 40]], { depositPct: 'A deposit of 0 to 30 %.' }],
]

describe('bad input of media', () => {
  it.each(bad)('%s', (_what, changes, expected) => expect(told(...changes)).toEqual(expected))
  it('is answered in sentences, whatever is missing or of the wrong kind', () => {
    const { told: complaints, bad } = badlyTold(mediaBody, clay)
    expect(complaints).toBeGreaterThan(200)
    expect(bad).toEqual([])
  })
})
