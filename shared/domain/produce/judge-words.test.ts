import { describe, expect, it } from 'vitest'

import { judgeWords } from '@/shared/domain/produce/judge-words'

const plain = { organic: null, form: 'whole', taxonId: null } as const
const rules = (text: string, declared: Parameters<typeof judgeWords>[1] = plain) =>
  judgeWords(text, declared).map(({ rule, effect }) => `${rule}:${effect}`)

describe('words of a produce listing', () => {
  it.each([
    'Organic basil',
    'grown ORGANICALLY',
    'certified-organic',
    'orga\u00ADnic kale',
    'ｏｒｇａｎｉｃ kale',
  ])('stops %s without a declaration', (text) => expect(rules(text)).toEqual(['organic:stop']))

  it('lets it stand once certified or exempt is declared', () => {
    expect(rules('organic basil', { ...plain, organic: 'certified' })).toEqual([])
    expect(rules('organic basil', { ...plain, organic: 'exempt-small' })).toEqual([])
  })

  it('names the sum and the words that are free', () => {
    const saying = judgeWords('organic', plain)[0]?.saying
    expect(saying).toContain('$5,000')
    expect(saying).toContain('grown without synthetic pesticides')
  })

  it.each(['inorganic sand', 'not organic', 'non-organic seed', 'no organic label', 'reorganicise'])(
    'takes %s for no claim',
    (text) => expect(rules(text)).toEqual([]),
  )

  it('is not fooled by "not just organic"', () => expect(rules('not just organic')).toEqual(['organic:stop']))

  it.each(['ready to eat', 'Ready-To-Eat', 'ready  to\neat', 'RTE salad'])(
    'stops %s unless that is the form',
    (text) => {
      expect(rules(text)).toEqual(['ready-to-eat:stop'])
      expect(rules(text, { ...plain, form: 'cut-mixed-or-washed' })).toEqual([])
    },
  )

  it.each(['alfalfa sprouts', 'Sprouted lentils', 'a sprout mix'])('stops %s', (text) =>
    expect(rules(text)).toEqual(['sprouts:stop']),
  )

  it.each(['Brussels sprouts', 'brussel sprouts', 'microgreens, not sprouts', 'sproutling'])(
    'passes %s',
    (text) => expect(rules(text)).toEqual([]),
  )

  it.each(['tilapia fillets', 'a filet', 'dressed fish', 'SMOKED trout'])('has %s read by a person', (text) =>
    expect(rules(text)).toEqual(['dead-fish:hold']),
  )

  it('has plants that the gate watches read by a person, under any name', () => {
    expect(rules('lettuce, and some kangkong')).toEqual(['watched-plant:hold'])
    expect(rules('with a bit of Hydrilla')).toEqual(['watched-plant:hold'])
    expect(rules('kangkong', { ...plain, taxonId: 'water_spinach' })).toEqual([])
  })

  it('leaves honest words alone', () =>
    expect(
      rules('Rainbow chard grown in fish water without synthetic pesticides. Eat it the same day.'),
    ).toEqual([]))

  it('reads the longest text a listing may hold in no time, even one made to be slow', () => {
    const start = performance.now()
    for (const part of ['not ', 'ready ', ' ', 'no-', 'brussel '])
      judgeWords(part.repeat(2000).slice(0, 2000) + 'organic', plain)
    expect(performance.now() - start).toBeLessThan(1000)
  })
})
