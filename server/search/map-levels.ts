/** Quadtree levels whose marks are kept summed. Level L has 2^L squares across the world. */
export const MAP_LEVELS: readonly number[] = [5, 7, 9, 11, 13]

/** From this zoom on every place has its own mark. */
export const PLACES_FROM_ZOOM = 12

/** The level whose marks stand 64 to 128 points apart at that zoom (the world is 256·2^zoom points wide). */
export function mapLevelOf(zoom: number): number {
  return MAP_LEVELS.find((level) => level > zoom) ?? MAP_LEVELS[MAP_LEVELS.length - 1] ?? 13
}
