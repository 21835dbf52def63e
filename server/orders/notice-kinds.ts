import type { NoticeKind } from '@/shared/contracts/notices'
import { edges, type EdgeId } from '@/shared/domain/orders/edges.facts'

const kinds: Partial<Record<EdgeId, NoticeKind>> = {
  E04: 'request',
  E05: 'accepted',
  E07: 'accepted',
  E14: 'scheduled',
  E18: 'weather-held',
  E19: 'moved',
  E22: 'ready',
  E27: 'weather-held',
  E28: 'moved',
  E29: 'dispatched',
  E30: 'handed-over',
  E33: 'unclear',
  E35: 'arrived',
  E36: 'late-box',
  E38: 'settled',
  E40: 'settled',
  E41: 'settled',
}

/** What kind of news an edge is; whatever ends an order early is `ended`. */
export function noticeKindOf(edge: EdgeId): NoticeKind {
  return kinds[edge] ?? (edges[edge].to === 'cancelled' ? 'ended' : 'unclear')
}
