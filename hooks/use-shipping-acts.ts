import { useMutation } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { newRequestKey } from '@/hooks/request-key'
import { useKeepOrder } from '@/hooks/use-orders'
import type { CallInput } from '@/shared/api/call'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type PressedAct = 'checkRoute' | 'reportArrival' | 'reportLateBox' | 'declineNewDay'
type FilledAct =
  | 'chooseShipDay'
  | 'keepRoutePapers'
  | 'dispatchOrder'
  | 'reportLateArrival'
  | 'holdForWeather'
  | 'agreeNewDay'

/** An act on a shipped or held order that needs no more than a press. */
export function usePressedAct(orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (act: PressedAct) => call(act, { params: { orderId }, key: newRequestKey() }),
    onSuccess: keep,
  })
}

/** One that carries a day, a count, papers or words. */
export function useFilledAct<A extends FilledAct>(act: A, orderId: string) {
  const keep = useKeepOrder()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints[A]>) => {
      const input = { params: { orderId }, body, key: newRequestKey() } as unknown as CallInput<A>
      return call(act, input) as Promise<ShownOrder>
    },
    onSuccess: keep,
  })
}

/** The packing sheet with its labels, as bytes of a PDF. */
export function usePackingSheet(orderId: string) {
  return useMutation({ mutationFn: () => call('printOrderPacking', { params: { orderId } }) })
}
