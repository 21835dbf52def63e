import { expect, it } from 'vitest'

import { parcelAsks } from './parcel-asks'
import { taskOf, type Parcel } from './parcel-of'
import { planLines } from './plan-words'

import { readAsks } from '@/components/tools/read-asks'
import { planPacking } from '@/shared/domain/transport/plan-packing'

function example(change: Partial<Parcel> = {}): Parcel {
  const { given, faults } = readAsks(parcelAsks, {}, 'us')
  expect(faults).toEqual({})
  return { ...(given.figures as unknown as Parcel), species: given.chosen.species ?? '', ...change }
}

it('finds a safe packing for its own example, and says it in plain lines', () => {
  const task = taskOf(example())
  const found = task && planPacking(task)
  expect(found?.plan?.answer.verdict).toBe('safe')
  const lines = found?.plan ? planLines(found.plan, 'us') : []
  expect(lines.map(({ label }) => label)).toContain('Packs in each box')
  expect(lines.every(({ text }) => text !== '' && !/NaN|undefined/.test(text))).toBe(true)
})

it('finds none in a hard frost without end, and says why', () => {
  const task = taskOf(example({ coldC: -35, hours: 47 }))
  const found = task && planPacking(task)
  expect(found?.plan).toBeNull()
  expect(found && 'because' in found && found.because.length).toBeGreaterThan(0)
})

it('has no answer for an animal without figures', () => {
  expect(taskOf(example({ species: 'unicorn' }))).toBeNull()
  expect(taskOf(example({ lengthMm: -1 }))).toBeNull()
})
