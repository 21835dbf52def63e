/** How an order of the demo that is shipped goes, and where it stands in the end. */
export type ShipPath = 'ship-settled' | 'ship-late' | 'ship-leaving' | 'ship-coming' | 'ship-held'

export interface ShipStory {
  path: ShipPath
  times: number
  /** Days from the demo's own day between which a lawful ship day is looked for, soonest first. */
  daysFromNow: readonly [least: number, most: number]
  farm?: string
  buyer?: 'beginner'
}

// Ordered five days ahead, inside the forecast: so they come out in every month of the year.
// Two neighbours have a day's boxes go to two growers each, who then answer the weather differently.
// prettier-ignore
export const shipStories: readonly ShipStory[] = [
  { path: 'ship-settled', times: 1, daysFromNow: [-16, -9], farm: 'hatchery', buyer: 'beginner' },
  { path: 'ship-settled', times: 2, daysFromNow: [-20, -9] },
  { path: 'ship-late', times: 1, daysFromNow: [-9, -4] },
  { path: 'ship-leaving', times: 1, daysFromNow: [0, 6], farm: 'hatchery' },
  { path: 'ship-leaving', times: 2, daysFromNow: [0, 6] },
  { path: 'ship-coming', times: 1, daysFromNow: [1, 6], farm: 'hatchery', buyer: 'beginner' },
  { path: 'ship-coming', times: 2, daysFromNow: [1, 6], farm: 'darbyflat' },
  { path: 'ship-coming', times: 2, daysFromNow: [1, 6], farm: 'riverstep' },
  { path: 'ship-held', times: 1, daysFromNow: [1, 6] },
]

/** Hardy in a box, and allowed between the three states by the demonstration's rows. */
export const shippedKinds = [
  'channel_catfish',
  'bluegill',
  'hybrid_bluegill',
  'goldfish',
  'common_carp_koi',
] as const

export const shipStreets = [
  '12 Alder Row',
  '408 Mill Race Road',
  '77 Quiet Alley',
  '1930 Ferry Street',
  '6 Orchard Hill',
] as const
