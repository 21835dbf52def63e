/** Usual air pressure at a height, mmHg, standard atmosphere. null below −400 m or above 4,000 m. */
export function barometerMmHg(elevationM: number): number | null {
  if (!(elevationM >= -400 && elevationM <= 4000)) return null
  return 760 * (1 - 2.25577e-5 * elevationM) ** 5.25588
}
