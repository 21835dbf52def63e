import { describe, expect, it } from 'vitest'

import { mapLevelOf } from '@/server/search/map-levels'

describe('the marks of the map', () => {
  it.each([
    [0, 5],
    [4, 5],
    [5, 7],
    [6, 7],
    [8, 9],
    [10, 11],
    [11, 13],
    [16, 13],
  ])('at zoom %i are squares of level %i', (zoom, level) => expect(mapLevelOf(zoom)).toBe(level))
})
