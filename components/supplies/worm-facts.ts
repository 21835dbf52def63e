import type { Fact } from '@/components/listings/fact-rows'
import type { WormBody } from '@/shared/contracts/worm-lot'
import { unitCount } from '@/shared/domain/listings/unit-words'
import { tierFor } from '@/shared/domain/money/tier-price'
import { supplyPrice } from '@/shared/domain/pricing/supply-price'
import { findState } from '@/shared/domain/rules/find-state'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { findWormKind } from '@/shared/domain/worms/find-worm-kind'
import { printLengthRange } from '@/shared/units/length'
import type { UnitSystem } from '@/shared/units/unit-system'

const counted: Record<NonNullable<WormBody['countMethod']>, string> = {
  hand: 'By hand',
  'sample-weight': 'By weight: a few weighed samples give the mean, the whole weight gives the number',
  displacement: 'By displacement: by how much water they push up',
}

interface Asked {
  units: UnitSystem
  count: number
}

export function wormGoods(body: WormBody, { units, count }: Asked): Fact[] {
  const taxon = findTaxon(body.taxonId)
  const many = findWormKind(body.taxonId)?.many ?? 'worms'
  const { saleUnit, sizeLoMm, sizeHiMm, overcountPct } = body
  const unitCents = tierFor(body.tiers, Math.max(count, body.minOrder))?.unitCents ?? 0
  const { price, comparable } = supplyPrice({ unit: saleUnit, unitCents }, units)
  const sized =
    sizeLoMm !== undefined && sizeHiMm !== undefined
      ? `Sorted, ${printLengthRange({ minCm: sizeLoMm / 10, maxCm: sizeHiMm / 10 }, units)}`
      : 'Sorted'
  return [
    {
      term: 'Kind',
      value: [taxon?.commonName ?? body.taxonId, taxon?.scientificName].filter(Boolean).join(', '),
    },
    { term: 'Called', value: body.strain },
    { term: 'Sizes', value: body.grading === 'sized' ? sized : 'Bed-run: all sizes as they come' },
    { term: 'One unit', value: unitCount(saleUnit, 1, many) },
    { term: 'Price', value: [price, comparable].filter(Boolean).join(', ') },
    { term: 'Counted', value: body.countMethod && counted[body.countMethod] },
    {
      term: 'Extra packed',
      value: overcountPct === 0 ? 'None: you get what you pay for.' : `${overcountPct} % extra for free`,
    },
    { term: 'Packed in', value: body.bedding },
    {
      term: 'By weight',
      value:
        saleUnit.kind === 'weight'
          ? 'The weight when packed counts. They lose water on the way and take it up again.'
          : undefined,
    },
  ]
}

export function wormOrigin(body: WormBody): Fact[] {
  const from = body.originState ? ` from ${findState(body.originState)?.name ?? body.originState}` : ''
  const origins: Record<WormBody['origin'], string> = {
    'hatched-here': 'Bred at this farm',
    'grown-on': `Bought small${from} and grown on here`,
    'bought-in': `Bought in${from}`,
  }
  return [
    { term: 'Where from', value: origins[body.origin] },
    { term: 'Raised in the US', value: body.raisedInUs ? 'Yes' : 'No: under a federal import permit' },
    { term: 'Jumping worms', value: 'The grower has looked through the lot for them.' },
    { term: 'Licences', value: body.licenceNumbers },
  ]
}
