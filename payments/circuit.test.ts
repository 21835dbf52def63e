import { expect, it } from 'vitest'
import { makeCircuit } from './circuit'

it('stops asking after five calls without an answer, and tries with one call after the rest', () => {
  let nowMs = 0
  const circuit = makeCircuit(15_000, () => nowMs)
  for (let call = 0; call < 5; call++) {
    expect(circuit.mayAsk()).toBe(true)
    circuit.unanswered()
  }
  expect(circuit.mayAsk()).toBe(false)
  nowMs = 14_999
  expect(circuit.mayAsk()).toBe(false)
  nowMs = 15_000
  expect([circuit.mayAsk(), circuit.mayAsk()]).toEqual([true, false])
  circuit.unanswered()
  expect(circuit.mayAsk()).toBe(false)
  nowMs = 30_000
  expect(circuit.mayAsk()).toBe(true)
  circuit.answered()
  expect([circuit.mayAsk(), circuit.mayAsk()]).toEqual([true, true])
})

it('forgets failures that were not in a row', () => {
  const circuit = makeCircuit(15_000, () => 0)
  for (let call = 0; call < 20; call++) {
    circuit.unanswered()
    circuit.unanswered()
    circuit.answered()
  }
  expect(circuit.mayAsk()).toBe(true)
})
