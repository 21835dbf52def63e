import { allEdges, type Edge, type EdgeActor, type EdgeId } from '@/shared/domain/orders/edges.facts'
import type { OrderState } from '@/shared/domain/orders/states.facts'

/** Edges out of a state (null: the beginning) that this actor may take alone or together with the other party. */
export function nextEdges(from: OrderState | null, actor: EdgeActor): (Edge & { id: EdgeId })[] {
  const isParty = actor === 'buyer' || actor === 'seller'
  return allEdges.filter(
    (edge) => edge.from === from && (edge.by.includes(actor) || (isParty && edge.by.includes('both'))),
  )
}
