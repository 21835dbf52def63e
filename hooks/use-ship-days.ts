import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

interface Asked {
  listingId: string
  /** ZIP or cell the box goes to; undefined: nobody has said. */
  near: string | undefined
  /** null: not a count yet. */
  quantity: number | null
}

const shipDaysQuery = ({ listingId, near, quantity }: Asked) =>
  queryOptions({
    queryKey: ['ship-days', 'listing', listingId, near ?? '', quantity],
    staleTime: STALE.minutes,
    queryFn: ({ signal }) =>
      call('readShipDays', {
        params: { listingId },
        query: { near: near ?? '', quantity: quantity ?? 1 },
        signal,
      }),
  })

const orderShipDaysQuery = (orderId: string) =>
  queryOptions({
    queryKey: ['ship-days', 'order', orderId],
    staleTime: STALE.minutes,
    queryFn: ({ signal }) => call('listOrderShipDays', { params: { orderId }, signal }),
  })

/** The coming days on which a box with so many animals could leave for a place; asked once both are said. */
export function useShipDays(asked: Asked) {
  const isReady = asked.near !== undefined && asked.quantity !== null
  return useQuery({ ...shipDaysQuery(asked), enabled: isReady, placeholderData: keepPreviousData })
}

/** The days an order could be moved to. */
export function useOrderShipDays(orderId: string, isReady = true) {
  return useQuery({ ...orderShipDaysQuery(orderId), enabled: isReady })
}
