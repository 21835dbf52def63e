import { describe, expect, it } from 'vitest'

import { nameOtherTaxa } from '@/shared/domain/listings/name-other-taxa'

describe('other animals named in a listing', () => {
  it('sees a blocked animal under its trade name', () => {
    expect(nameOtherTaxa('Indian murrel fingerlings, very hardy', 'channel_catfish')).toEqual([
      { taxonId: 'striped_snakehead', blocked: true },
    ])
  })

  it('holds a look-alike name of a lawful fish for a moderator', () => {
    expect(nameOtherTaxa('European perch, feed-trained', 'yellow_perch')).toEqual([
      { taxonId: 'european_perch', blocked: true },
    ])
    expect(nameOtherTaxa('Some bluegill may be among them', 'yellow_perch')).toEqual([
      { taxonId: 'bluegill', blocked: false },
    ])
  })

  it.each([
    ['Nile tilapia, Oreochromis niloticus, a tilapia for warm water', 'nile_tilapia'],
    ['Hybrid bluegill: green sunfish times bluegill', 'hybrid_bluegill'],
    ['They grow beside lettuce and eat red worms', 'bluegill'],
    ['', 'bluegill'],
  ])('does not mind %j for %s', (text, taxonId) => expect(nameOtherTaxa(text, taxonId)).toEqual([]))
})
