import { dailyCurve } from '@/shared/domain/climate/daily-curve'
import type { MonthNormals } from '@/shared/domain/climate/month-normals'

/** Usual minimum and maximum of one day of the year and their day-to-day standard deviation, °C, as the table says. */
export interface NormalDay {
  minC: number
  maxC: number
  sdMinC: number
  sdMaxC: number
}

/** The spread goes by the same lines as the means and is never below 1 °C. null for a day outside 0-364. */
export function normalDay(normals: MonthNormals, day: number): NormalDay | null {
  return normalYear(normals)[day] ?? null
}

/** All 365 days. */
export function normalYear(normals: MonthNormals): NormalDay[] {
  const [minC, maxC, sdMinC, sdMaxC] = [normals.minC, normals.maxC, normals.sdMinC, normals.sdMaxC].map(
    dailyCurve,
  )
  return (minC ?? []).map((low, day) => ({
    minC: low,
    maxC: maxC?.[day] ?? NaN,
    sdMinC: Math.max(1, sdMinC?.[day] ?? NaN),
    sdMaxC: Math.max(1, sdMaxC?.[day] ?? NaN),
  }))
}
