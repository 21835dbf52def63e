import { expect, it } from 'vitest'

import { neighboursOf } from './neighbours'

const queue = ['7', '3', '9']

it('goes through the queue in its order', () => {
  expect(neighboursOf('3', queue, '9')).toEqual({ previous: '7', next: '9' })
  expect(neighboursOf('7', queue, '3')).toEqual({ previous: undefined, next: '3' })
})

it('stops at the end instead of going round', () => {
  expect(neighboursOf('9', queue, '7')).toEqual({ previous: '3', next: undefined })
})

it('takes the next of the server for one that is not in the queue', () => {
  expect(neighboursOf('4', queue, '3')).toEqual({ previous: undefined, next: '3' })
  expect(neighboursOf('4', queue, undefined)).toEqual({ previous: undefined, next: '7' })
})
