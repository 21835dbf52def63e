import type { ClimateNode, MonthNormals } from '@/shared/domain/climate/month-normals'

const STEP_DEG = 0.5

/** Nodes of the half-degree grid by their place. */
export type ClimateGrid = ReadonlyMap<number, MonthNormals>

const placeOf = (lat: number, lng: number) => Math.round(lat / STEP_DEG) * 1000 + Math.round(lng / STEP_DEG)

export function climateGrid(nodes: readonly ClimateNode[]): ClimateGrid {
  return new Map(nodes.map(({ lat, lng, normals }) => [placeOf(lat, lng), normals]))
}

/**
 * Usual weather at a point: bilinear between the four nodes around it, missing nodes left out and the rest weighed anew.
 * null where none of the four is there (no station near: sea, outside the US) or the point is no place on Earth.
 */
export function normalsAt(grid: ClimateGrid, lat: number, lng: number): MonthNormals | null {
  if (!(Math.abs(lat) <= 90 && Math.abs(lng) <= 180)) return null
  const [south, west] = [Math.floor(lat / STEP_DEG) * STEP_DEG, Math.floor(lng / STEP_DEG) * STEP_DEG]
  const [up, right] = [(lat - south) / STEP_DEG, (lng - west) / STEP_DEG]
  const corners = [
    { north: 0, east: 0, weight: (1 - up) * (1 - right) },
    { north: 0, east: 1, weight: (1 - up) * right },
    { north: 1, east: 0, weight: up * (1 - right) },
    { north: 1, east: 1, weight: up * right },
  ].flatMap(({ north, east, weight }) => {
    const normals = grid.get(placeOf(south + north * STEP_DEG, west + east * STEP_DEG))
    return normals && weight > 0 ? [{ normals, weight }] : []
  })
  const all = corners.reduce((sum, { weight }) => sum + weight, 0)
  if (all === 0) return null
  const mean = (kind: keyof MonthNormals) =>
    Array.from({ length: 12 }, (_, month) =>
      corners.reduce((sum, { normals, weight }) => sum + (weight / all) * (normals[kind][month] ?? NaN), 0),
    )
  return { minC: mean('minC'), maxC: mean('maxC'), sdMinC: mean('sdMinC'), sdMaxC: mean('sdMaxC') }
}
