import type { ClimateNode } from '@/shared/domain/climate/month-normals'

/**
 * Text of the climate table (comment lines, a heading, then lat, lng and 48 tenths of a degree) → nodes, °C.
 * Throws on a line that is not complete: a table half read must not answer.
 */
export function readClimateCsv(text: string): ClimateNode[] {
  const lines = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'))
  return lines.slice(1).map((line) => {
    const [lat, lng, ...tenths] = line.split(',').map(Number)
    if (
      lat === undefined ||
      lng === undefined ||
      tenths.length !== 48 ||
      tenths.some((one) => !Number.isFinite(one))
    ) {
      throw new Error(`The climate table has a broken line: ${line.slice(0, 40)}`)
    }
    const months = (from: number) => tenths.slice(from, from + 12).map((tenth) => tenth / 10)
    return {
      lat,
      lng,
      normals: { minC: months(0), maxC: months(12), sdMinC: months(24), sdMaxC: months(36) },
    }
  })
}
