import { expect, it } from 'vitest'

import { dispatchErrors, nearestDayWords, tickIds, tickWords } from './dispatch-words'

it('asks for every tick by its own words, and for the number from the receipt', () => {
  const errors = dispatchErrors({ tracking: ' 12 ', ticks: tickIds.slice(1) })
  expect(errors.map(({ fieldId }) => fieldId)).toEqual([`tick-${tickIds[0]}`, 'tracking'])
  expect(errors[0]?.message).toContain(tickIds[0] ? tickWords[tickIds[0]].label : '?')
  expect(dispatchErrors({ tracking: '1Z999', ticks: tickIds })).toEqual([])
})

it('names what the postal rule forbids and asks for', () => {
  const all = Object.values(tickWords).map(({ label, hint }) => `${label} ${hint}`)
  for (const word of [
    /double-wall/,
    /Live animals.*return address/,
    /flat-rate/,
    /carrier was told/,
    /sheet/,
  ])
    expect(all.filter((text) => word.test(text)).length, String(word)).toBeGreaterThan(0)
})

it('tells the nearest lawful day where the refusal names one', () => {
  expect(nearestDayWords({ nearestShipDay: '2027-05-17' })).toBe(
    'The nearest day on which it may leave: Mon, May 17.',
  )
  expect(nearestDayWords({})).toBeNull()
  expect(nearestDayWords(undefined)).toBeNull()
})
