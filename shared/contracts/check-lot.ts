import type { TypedWindow } from '@/shared/contracts/lot-terms'

export type Wrong = (path: (string | number)[], message: string) => void

interface Stock {
  countOnHand: number
  minOrder: number
  mostPerBuyer?: number | undefined
  tiers: readonly { fromCount: number; unitCents: number }[]
}

/** Rules between the counts and prices of a listing. */
export function checkStock(lot: Stock, wrong: Wrong): void {
  lot.tiers.forEach((tier, at) => {
    const before = lot.tiers[at - 1]
    if (before && tier.fromCount <= before.fromCount) {
      wrong(['tiers', at, 'fromCount'], 'Each price starts at a larger count than the one before.')
    }
    if (before && tier.unitCents >= before.unitCents) {
      wrong(['tiers', at, 'unitCents'], 'The price must fall as the count grows.')
    }
  })
  const first = lot.tiers[0]
  if (first && first.fromCount > lot.minOrder) {
    wrong(['tiers', 0, 'fromCount'], 'The first price must cover your smallest order.')
  }
  if (lot.minOrder > lot.countOnHand) wrong(['minOrder'], 'The smallest order is more than you have.')
  if (lot.mostPerBuyer !== undefined && lot.mostPerBuyer < lot.minOrder) {
    wrong(['mostPerBuyer'], 'The most for one buyer is below your smallest order.')
  }
}

/** Every pickup window ends after it starts. */
export function checkWindows(lot: { windows: readonly TypedWindow[] }, wrong: Wrong): void {
  lot.windows.forEach((window, at) => {
    if (window.until <= window.from) wrong(['windows', at, 'until'], 'The window must end after it starts.')
  })
}
