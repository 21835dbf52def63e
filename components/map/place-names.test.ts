import { expect, it } from 'vitest'

import { placeNames } from './place-names'

const size = { widthPx: 400, heightPx: 300 }
const lettering = { fontPx: 15, letterSpacingPx: 2 }
const named = (name: string, x: number, y: number) => ({ name, x, y })

it('leaves out what would lie on a name nearer the middle, or reach over the edge', () => {
  const names = [
    named('Kentucky', 205, 160),
    named('Ohio', 200, 155),
    named('Indiana', 80, 150),
    named('Pennsylvania', 390, 150),
  ]
  expect(placeNames(names, size, lettering).map(({ name }) => name)).toEqual(['Ohio', 'Indiana'])
})

it('keeps all that are clear of each other', () => {
  const names = [named('Ohio', 200, 60), named('Kentucky', 200, 120), named('Tennessee', 200, 200)]
  expect(placeNames(names, size, lettering)).toHaveLength(3)
})
