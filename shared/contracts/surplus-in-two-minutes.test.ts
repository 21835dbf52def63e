import { describe, expect, it } from 'vitest'

import { lettuce } from '@/shared/contracts/lettuce-for-tests'
import { produceBody } from '@/shared/contracts/produce-lot'
import { printSaleUnit } from '@/shared/domain/listings/sale-unit'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { produceCaution } from '@/shared/domain/produce/judge-form'
import { nextLotCode } from '@/shared/domain/produce/lot-code'
import { sellBy } from '@/shared/domain/produce/sell-by'
import { unitPrice } from '@/shared/domain/produce/unit-price'

describe('a surplus posted in two minutes (G-A1)', () => {
  it('gets its lot code, its price, its last day and its words from the answers alone', () => {
    const body = produceBody.parse(lettuce)
    const crop = findCrop(body.cropId)
    if (!crop) throw new Error('no lettuce')
    const { harvest, form, handling } = body
    expect(nextLotCode(harvest.day, harvest.bed ?? null, [])).toBe('L-0412-RAFT3')
    expect(
      unitPrice({ crop, unit: body.saleUnit, unitCents: body.tiers[0]?.unitCents ?? 0 }, 'us').price,
    ).toBe('$3.00 a head')
    expect(printSaleUnit(body.saleUnit)).toBe('head')
    expect(sellBy({ crop, form, harvestDay: harvest.day, heldC: handling.heldC })?.day).toBe('2027-04-19')
    expect(produceCaution).toMatch(/^Wash before eating/)
  })
})
