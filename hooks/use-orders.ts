import {
  infiniteQueryOptions,
  queryOptions,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query'

import { call } from '@/hooks/api'
import type { CallInput } from '@/shared/api/call'
import { newRequestKey } from '@/hooks/request-key'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type Side = 'buyer' | 'seller'

const POLL_MS = 4000
const SLOW_POLL_MS = 20_000

/** While somebody else's act is awaited the page asks again by itself. */
function pollMs(order: ShownOrder | undefined): number | false {
  if (!order || order.state === 'settled' || order.state === 'cancelled') return false
  return order.state === 'reserved' || order.accepting ? POLL_MS : SLOW_POLL_MS
}

const orderQuery = (orderId: string) =>
  queryOptions({
    queryKey: ['orders', orderId],
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readOrder', { params: { orderId }, signal }),
    refetchInterval: (query) => pollMs(query.state.data),
  })

export function useOrder(orderId: string) {
  return useQuery(orderQuery(orderId))
}

const ordersQuery = (as: Side) =>
  infiniteQueryOptions({
    queryKey: ['orders', 'list', as],
    staleTime: STALE.live,
    initialPageParam: '',
    queryFn: ({ pageParam, signal }) =>
      call('listOrders', { query: { as, ...(pageParam ? { cursor: pageParam } : {}) }, signal }),
    getNextPageParam: (page) => page.nextCursor,
  })

export function useOrders(as: Side) {
  return useInfiniteQuery(ordersQuery(as))
}

type PlainAct =
  | 'payDeposit'
  | 'leaveReservation'
  | 'withdrawRequest'
  | 'acceptOrder'
  | 'markReady'
  | 'payBalance'
  | 'confirmGood'

/** What an act on an order changes: the order itself, and every list that shows it. */
export function useKeepOrder() {
  const client = useQueryClient()
  return (order: ShownOrder) => {
    client.setQueryData(['orders', order.orderId], order)
    void client.invalidateQueries({ queryKey: ['orders', 'list'] })
    void client.invalidateQueries({ queryKey: ['listings'] })
    void client.invalidateQueries({ queryKey: ['ship-days'] })
    void client.invalidateQueries({ queryKey: ['routes'] })
    void client.invalidateQueries({ queryKey: ['me'] })
    void client.invalidateQueries({ queryKey: ['notices'] })
  }
}

/** One act on an order that needs no more than a press. A fresh key a press; a repeat of the same press is the same act. */
export function useOrderAct(orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (act: PlainAct) => call(act, { params: { orderId }, key: newRequestKey() }),
    onSuccess: keep,
  })
}

export function useDecline(orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['declineOrder']>) =>
      call('declineOrder', { params: { orderId }, body, key: newRequestKey() }),
    onSuccess: keep,
  })
}

export function useHandOver(orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['handOver']>) =>
      call('handOver', { params: { orderId }, body, key: newRequestKey() }),
    onSuccess: keep,
  })
}

type WordyAct = 'cancelOrder' | 'chooseSlot' | 'reportNoShow' | 'contestNoShow' | 'stopOrder' | 'decideOrder'

/** One act on an order that carries words or a choice. */
export function useWordyAct<A extends WordyAct>(act: A, orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints[A]>) => {
      const input = { params: { orderId }, body, key: newRequestKey() } as unknown as CallInput<A>
      return call(act, input) as Promise<ShownOrder>
    },
    onSuccess: keep,
  })
}

/** The key is made when the form opens: pressing twice, or again after a lost answer, reserves once. */
export function useReserveBatch(listingId: string, key: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['reserveBatch']>) =>
      call('reserveBatch', { params: { listingId }, body, key }),
    onSuccess: keep,
  })
}
