import { createContext, use } from 'react'

import type * as Goods from './supplies-group'

/** What is known of worms, media and produce: loaded as a group of its own, so that it may serve buyers too. */
export const GoodsContext = createContext<typeof Goods | null>(null)

export function useGoods(): typeof Goods {
  const goods = use(GoodsContext)
  if (!goods) throw new Error('a form of supplies outside its desk')
  return goods
}
