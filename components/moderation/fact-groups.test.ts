import { expect, it } from 'vitest'

import { factGroups } from './fact-groups'
import { fieldWords } from './field-words'

it('names every field it shows in words', () => {
  for (const field of factGroups.flatMap((group) => group.fields))
    expect(fieldWords(field), field).not.toBe(field)
})

it('shows no field twice', () => {
  const fields = factGroups.flatMap((group) => group.fields)
  expect(new Set(fields).size).toBe(fields.length)
})
