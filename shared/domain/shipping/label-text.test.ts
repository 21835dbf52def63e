import { describe, expect, it } from 'vitest'

import { isLabelText, labelText } from '@/shared/domain/shipping/label-text'

describe('text on a label', () => {
  it.each([
    ['Zoë Núñez, 12 ½ O’Hara St. – rear', true, 'Zoë Núñez, 12 ½ O’Hara St. – rear'],
    ['Zoe\u0308', true, 'Zoë'],
    ['Nguyễn', false, 'Nguyen'],
    ['Łódź', false, '?ódz'],
    ['ферма', false, '?????'],
    ['Pond 🐟', false, 'Pond ?'],
    ['two\nlines', false, 'two?lines'],
  ])('%j is as printed: %s', (text, isAsIs, printed) => {
    expect([isLabelText(text), labelText(text)]).toEqual([isAsIs, printed])
  })
})
