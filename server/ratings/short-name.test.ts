import { describe, expect, it } from 'vitest'

import { shortName } from '@/server/ratings/short-name'

describe('the public name of a buyer', () => {
  it.each([
    ['Bea Kowalski', 'Bea K.'],
    ['  Ana  María  de la Cruz ', 'Ana C.'],
    ['Bo', 'Bo'],
    ['Zoë ångström', 'Zoë Å.'],
    ['Bea 🐟fish', 'Bea 🐟.'],
    ['', ''],
  ])('%s', (name, short) => expect(shortName(name)).toBe(short))
})
