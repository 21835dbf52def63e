import { describe, expect, it } from 'vitest'

import { readAsks } from './read-asks'
import { findTool, toolList } from './tool-list'

import { sources } from '@/shared/sources'

import type { Tool, ToolAnswer } from './tool'

function answerOf(tool: Tool, typed: Record<string, string>): ToolAnswer {
  const { given, faults } = readAsks(tool, typed, 'us')
  expect(faults).toEqual({})
  return tool.answer(given)
}

function lineOf(answer: ToolAnswer, label: string): string | undefined {
  return 'lines' in answer ? answer.lines.find((line) => line.label === label)?.text : undefined
}

const tool = (id: string) => findTool(id) as Tool

describe.each(toolList.map((one) => [one.id, one] as const))('%s', (_id, one) => {
  it.each(['us', 'metric'] as const)('answers its own example in %s units', (units) => {
    const { given, faults } = readAsks(one, {}, units)
    expect(faults).toEqual({})
    const answer = one.answer(given)
    expect(
      'lines' in answer && answer.lines.every(({ text }) => text !== '' && !/NaN|undefined|null/.test(text)),
    ).toBe(true)
  })

  it('never answers an absurd figure with a number', () => {
    for (const { id } of one.asks) {
      for (const text of ['-99999', '99999999']) {
        const { given, faults } = readAsks(one, { [id]: text }, 'us')
        const answer = one.answer(given)
        const isHeld =
          id in faults || 'refusal' in answer || answer.lines.every((line) => !/NaN|∞/.test(line.text))
        expect(isHeld, `${id} of ${text} gave ${JSON.stringify(answer)}`).toBe(true)
      }
    }
  })

  it('does not answer below what can be measured', () => {
    for (const { id } of one.asks) {
      const { given, faults } = readAsks(one, { [id]: '-9999' }, 'us')
      expect(id in faults || 'refusal' in one.answer(given), id).toBe(true)
    }
  })

  it('names a source for each equation', () => {
    for (const { sourceKeys } of one.equations) {
      expect(sourceKeys.length).toBeGreaterThan(0)
      for (const key of sourceKeys) expect(sources[key]).toBeDefined()
    }
  })
})

describe('published figures', () => {
  it('Emerson: 5.37 % at 25 °C and pH 8.0', () => {
    expect(lineOf(answerOf(tool('ammonia'), { waterC: '77 F', pH: '8.0' }), 'Share of the total')).toBe(
      '5.37 %',
    )
  })

  it('Benson and Krause: 9.09 mg/L at 20 °C at the sea', () => {
    const answer = answerOf(tool('oxygen'), { waterC: '68', elevationM: '0', salinityPpt: '0' })
    expect(lineOf(answer, 'Full of oxygen at')).toBe('9.09 mg/L')
  })
})

describe('a field that cannot be read', () => {
  it('is named, and nothing is reckoned from it', () => {
    expect(readAsks(tool('ammonia'), { pH: 'sour' }, 'us').faults).toEqual({ pH: 'A figure, like 7.4.' })
  })
})
