import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { hintRules, primaryRules } from '@/shared/domain/rules/species-rules.facts'
import { blockList, guardedTaxa } from '@/shared/domain/rules/block-list.facts'
import { aliases } from '@/shared/domain/species/aliases.facts'
import { catfishTableSource } from '@/shared/domain/species/catfish-table.facts'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { stages } from '@/shared/domain/species/stages.facts'
import { openDataSources, printSource, sources, type SourceKey } from '@/shared/sources'

const facts = readdirSync('shared/domain', { recursive: true, encoding: 'utf8' })
  .filter((file) => file.endsWith('.ts') && !file.endsWith('.test.ts'))
  .map((file) => readFileSync(`shared/domain/${file}`, 'utf8'))
  .join('\n')

const keys = Object.keys(sources) as SourceKey[]

describe('sources', () => {
  it('cites nothing that no figure or rule rests on', () => {
    const used = (key: SourceKey) => facts.includes(`'${key}'`) || openDataSources.includes(key)
    expect(keys.filter((key) => !used(key))).toEqual([])
  })

  it('is there for every fact of species, names, blocks and rules', () => {
    const rows = [...stages, ...aliases, ...blockList, ...primaryRules, ...hintRules].map(
      (row) => row.sourceKey,
    )
    const lists = [...speciesFacts, ...guardedTaxa].map((row) => row.sourceKeys)
    for (const list of lists) expect(list.length).toBeGreaterThan(0)
    const cited = [...rows, ...lists.flat(), catfishTableSource]
    expect(cited.filter((key) => !Object.hasOwn(sources, key))).toEqual([])
  })

  it('prints author, year, title and how it was read', () => {
    expect(printSource('srac-283')).toBe(
      'Popma & Masser, 1999, Tilapia: life history and biology, SRAC Publication 283 (read in a reproduction)',
    )
    expect(printSource('house-rule')).toBe('House rule: our own cautious judgement')
    for (const key of keys) expect(printSource(key)).not.toMatch(/null|undefined/)
  })
})
