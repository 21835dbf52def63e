import { expect, it } from 'vitest'

import { scaleBar } from './scale-bar'

it('shows ten miles as a hundred pixels when a pixel is a tenth of a mile', () => {
  expect(scaleBar(0.1609344)).toEqual({ miles: 10, widthPx: 100 })
})

it('takes the next round number when the longer one would not fit', () => {
  expect(scaleBar(0.14)).toEqual({ miles: 5, widthPx: 57 })
})

it('stays within 110 pixels from a street to the whole country', () => {
  for (const kmPerPixel of [0.01, 0.05, 0.3, 1, 4, 12])
    expect(scaleBar(kmPerPixel).widthPx).toBeLessThanOrEqual(110)
})
