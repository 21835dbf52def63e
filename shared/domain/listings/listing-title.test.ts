import { describe, expect, it } from 'vitest'

import { listingTitle } from '@/shared/domain/listings/listing-title'

describe('the title of a batch', () => {
  it.each([
    [{ taxonId: 'nile_tilapia', stage: 'fingerling' }, 'Nile tilapia fingerlings'],
    [{ taxonId: 'bluegill', stage: 'fry' }, 'Bluegill fry'],
    [{ taxonId: 'yellow_perch', stage: 'advanced-fingerling' }, 'Yellow perch advanced fingerlings'],
    [
      { taxonId: 'blue_tilapia', strain: 'Ohio white', stage: 'breeder' },
      'Blue tilapia (Ohio white) breeders',
    ],
    [{ taxonId: 'nothing-we-know', stage: '' }, 'Fish'],
  ])('%o is %s', (named, title) => expect(listingTitle(named)).toBe(title))
})
