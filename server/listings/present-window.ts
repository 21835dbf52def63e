import type { WindowRow } from '@/server/listings/window-store'
import type { ShownWindow } from '@/shared/contracts/listings'

export function presentWindow(row: WindowRow): ShownWindow {
  return {
    windowId: row.publicId,
    startsAt: row.startsAt.toISOString(),
    endsAt: row.endsAt.toISOString(),
    zone: row.zone,
    placesLeft: row.capacity - row.taken,
    placeKind: row.placeKind,
  }
}
