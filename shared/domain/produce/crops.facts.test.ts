import { describe, expect, it } from 'vitest'

import { crops } from '@/shared/domain/produce/crops.facts'
import { findCrop, matchCrop } from '@/shared/domain/produce/find-crop'
import { findGuard } from '@/shared/domain/rules/find-block'
import { traceLineage } from '@/shared/domain/species/trace-lineage'
import { sources } from '@/shared/sources'

describe('crops', () => {
  it('are some thirty, each once, with a source for every figure', () => {
    expect(crops.length).toBeGreaterThanOrEqual(25)
    expect(new Set(crops.map((crop) => crop.id)).size).toBe(crops.length)
    for (const crop of crops) {
      const cited = [...crop.sourceKeys, ...crop.keeps.map((row) => row.sourceKey)]
      expect(crop.sourceKeys.length, crop.id).toBeGreaterThan(0)
      expect(cited.filter((key) => !Object.hasOwn(sources, key))).toEqual([])
    }
  })

  it('hold figures that can be: ranges in order, lives of at least a day, no gap that overlaps', () => {
    for (const { id, storeC, humidityPct, keeps, soldBy, chillsBelowC } of crops) {
      if (storeC) expect(storeC[0], id).toBeLessThanOrEqual(storeC[1])
      if (storeC && chillsBelowC !== null) expect(storeC[0], id).toBeGreaterThanOrEqual(chillsBelowC)
      if (humidityPct) expect(humidityPct[1], id).toBeLessThanOrEqual(100)
      expect(soldBy.length, id).toBeGreaterThan(0)
      keeps.forEach((row, at) => {
        expect(row.fromC, id).toBeLessThan(row.toC)
        expect(row.days[0], id).toBeGreaterThanOrEqual(1)
        expect(row.days[0], id).toBeLessThanOrEqual(row.days[1])
        const before = keeps[at - 1]
        if (before) expect(before.toC, id).toBeLessThanOrEqual(row.fromC)
      })
    }
  })

  it('call no two crops by one name', () => {
    const names = crops.flatMap((crop) => [crop.name, ...crop.alsoCalled])
    for (const name of names)
      expect(
        crops.filter((crop) => [crop.name, ...crop.alsoCalled].includes(name)).map((crop) => crop.id),
      ).toHaveLength(1)
    for (const crop of crops) for (const name of crop.alsoCalled) expect(matchCrop(name)?.id).toBe(crop.id)
  })
})

describe('the crop behind a name', () => {
  it.each(['kangkong', 'Ong Choy', 'rau muong', 'Ipomoea aquatica', 'WATER SPINACH', 'swamp cabbage'])(
    'leads %s to water spinach, which the species gate watches',
    (typed) => {
      const crop = matchCrop(typed)
      expect(crop?.id).toBe('water_spinach')
      const lineage = traceLineage(crop?.taxonId ?? '')
      expect(lineage && findGuard(lineage)?.papers.length).toBe(1)
    },
  )

  it('leaves spinach and lettuce alone, and does not know what it does not know', () => {
    expect(matchCrop('spinach')?.taxonId).toBeNull()
    expect(matchCrop('Rainbow chard')?.id).toBe('chard')
    expect(matchCrop('sprouts')).toBeNull()
    expect(matchCrop('tilapia')).toBeNull()
    expect(findCrop('kangkong')).toBeNull()
  })
})
