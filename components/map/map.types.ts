export interface LatLng {
  lat: number
  lng: number
}

export interface MapPinFacts extends LatLng {
  id: string
  /** What hangs there, in words: "3 listings near Dayton, OH". */
  label: string
  /** How many listings the pin stands for; 1 when absent. */
  count?: number
}

export interface MapTown extends LatLng {
  name: string
}

export interface MapArea {
  center: LatLng
  radiusKm: number
}

export interface MapProps {
  /** Names the map: "Listings near Dayton, OH". */
  label: string
  center: LatLng
  /** Drawn as a circle, and what the first view fits. */
  radiusKm: number
  pins: readonly MapPinFacts[]
  /** Names written on the map for orientation. */
  towns?: readonly MapTown[]
  selectedId?: string
  onSelect: (id: string) => void
  /** After the member moved the map: the circle that now fits the view. */
  onMoveEnd?: (area: MapArea) => void
}
