/** What an edge does with money, in words; `none` moves nothing. */
export const moneyActs = {
  none: 'no money moves',
  'cancel-checkout': 'the open payment page is closed',
  'authorise-deposit': 'the deposit is earmarked on the card, nothing is taken',
  'capture-deposit': 'the deposit is taken and held',
  'capture-base-tier': 'the deposit at the dearest tier of the pool is taken and held',
  'capture-authorised': 'the earmarked deposit is taken and held',
  void: 'the earmark is released',
  'price-falls': 'nothing is charged; the price falls to the tier that was reached',
  'refund-deposit': 'the deposit goes back in full',
  'refund-or-keep':
    'inside the free time everything goes back; after it the deposit is kept and the rest goes back',
  'refund-all': 'everything goes back, no fee',
  'capture-balance': 'the balance is taken when the buyer pays it',
  'keep-deposit': 'the deposit is kept, up to the listing’s own, and nothing else is charged',
  'refund-balance-keep-deposit': 'the balance goes back; the deposit is kept, the fee only on what is kept',
  transfer: 'total less fee and tax goes to the seller',
  'refund-agreed-transfer': 'the agreed part goes back, the rest less the fee goes to the seller',
  'refund-claimed-transfer':
    'what was claimed goes back, up to the goods value of the shortfall; the rest goes to the seller',
  'void-or-refund-all': 'the earmark is released or everything goes back, no fee',
} as const

export type MoneyAct = keyof typeof moneyActs
