import { mediaGoods } from './media-facts'
import { produceGoods, produceHarvest } from './produce-facts'
import { wormGoods, wormOrigin } from './worm-facts'

import type { SupplyBody } from './supply-body'
import type { Fact } from '@/components/listings/fact-rows'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface FactGroup {
  title: string
  facts: Fact[]
}

interface Asked {
  units: UnitSystem
  count: number
}

/** Everything the seller says of worms, media or produce, with what it means beside it. */
export function supplyFacts(body: SupplyBody, asked: Asked): FactGroup[] {
  switch (body.category) {
    case 'produce':
      return [
        { title: 'What it is', facts: produceGoods(body, asked) },
        { title: 'Harvest and keeping', facts: produceHarvest(body) },
      ]
    case 'worms':
      return [
        { title: 'The worms', facts: wormGoods(body, asked) },
        { title: 'Where they come from', facts: wormOrigin(body) },
      ]
    case 'media':
      return [{ title: 'The material', facts: mediaGoods(body, asked) }]
  }
}
