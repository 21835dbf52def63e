/** Twelve figures, January first. */
export type Months = readonly number[]

/** Usual daily minimum and maximum of each month and their day-to-day standard deviation, °C. */
export interface MonthNormals {
  minC: Months
  maxC: Months
  sdMinC: Months
  sdMaxC: Months
}

export interface ClimateNode {
  lat: number
  lng: number
  normals: MonthNormals
}
