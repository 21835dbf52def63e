import type { CellPoint } from '@/shared/domain/geo/location-cell'

export type NoLocation = 'refused' | 'unknown'

const waitMs = 10_000
const goodForMs = 5 * 60_000
const refusedCode = 1

/** Where the device is, after its owner has said yes. The point goes no further than the caller. */
export function askDevice(): Promise<CellPoint | NoLocation> {
  return new Promise((answer) => {
    if (!('geolocation' in navigator)) {
      answer('unknown')
      return
    }
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => answer({ lat: coords.latitude, lng: coords.longitude }),
      ({ code }) => answer(code === refusedCode ? 'refused' : 'unknown'),
      { enableHighAccuracy: false, timeout: waitMs, maximumAge: goodForMs },
    )
  })
}
