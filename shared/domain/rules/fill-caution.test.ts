import { describe, expect, it } from 'vitest'
import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { judgeGate } from '@/shared/domain/rules/gate'
import { demoRules } from '@/shared/domain/rules/demo-rules.facts'
import { wordCautions } from '@/shared/domain/rules/word-cautions'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

describe('caution texts', () => {
  it('holds fourteen, numbered', () => {
    expect(Object.keys(cautionTexts)).toEqual(Array.from({ length: 14 }, (_, at) => `G-${at + 1}`))
  })

  it('fills every gap', () => {
    expect(fillCaution('G-3', { state: 'Ohio' })).toBe(
      'Nobody has checked this species for Ohio for us. We cannot tell you it is allowed.',
    )
    expect(fillCaution('G-8', { hours: '6' })).toMatch(/^Bag sealed more than 6 hours/)
    expect(fillCaution('G-12', {})).toBe(cautionTexts['G-12'])
  })

  it('words the cautions of a judgement without a brace left over', () => {
    const taxon = traceLineage('nile_tilapia')
    if (!taxon) throw new Error('no tilapia')
    const judged = judgeGate({
      taxon,
      rules: demoRules,
      sellerState: 'OH',
      handOverState: 'IN',
      buyerState: 'IN',
      crossesLine: true,
      today: '2027-01-15',
      viewer: 'buyer',
    })
    const worded = wordCautions(judged, { buyerState: 'IN' })
    expect(worded.map((one) => one.id)).toEqual(['G-1', 'G-2', 'G-3', 'G-5', 'G-6', 'G-13'])
    for (const { text } of worded) expect(text).not.toMatch(/[{}]/)
    expect(worded[1]?.text).toContain('Demonstration only')
    expect(worded[1]?.text).toMatch(/, checked [A-Z][a-z]{2}, [A-Z][a-z]{2} \d+, \d{4}\. /)
    expect(worded[2]?.text).toContain('Ohio')
  })
})
