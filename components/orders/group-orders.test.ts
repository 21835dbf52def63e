import { expect, it } from 'vitest'

import { groupOrders } from './group-orders'

import type { OrderRow } from '@/shared/contracts/orders'

const order = (change: Partial<OrderRow>): OrderRow => ({
  orderId: 'x',
  party: 'buyer',
  state: 'scheduled',
  listingId: 'l',
  title: 'Bluegill fingerlings',
  quantity: 25,
  otherParty: { name: 'Millrace' },
  handOver: 'pickup',
  balanceDue: 'at-handover',
  balancePaid: false,
  may: ['cancel'],
  totalCents: 2375,
  createdAt: '2027-01-15T12:00:00.000Z',
  ...change,
})

it('asks a buyer to act only where the order waits for them, whatever else they may do', () => {
  const agreed = order({ orderId: 'agreed' })
  const owing = order({ orderId: 'owing', balanceDue: 'before' })
  const asked = order({ orderId: 'asked', party: 'seller', state: 'requested' })
  const done = order({ orderId: 'done', state: 'settled' })
  const ended = order({ orderId: 'ended', state: 'cancelled' })
  expect(groupOrders([agreed, owing, done, asked, ended])).toEqual({
    yours: [owing, asked],
    coming: [agreed],
    past: [done, ended],
  })
})
