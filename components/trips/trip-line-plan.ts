import type { TripStep } from '@/shared/domain/transport/trip'

export interface LinePlan {
  /** SVG path of the water temperature. */
  path: string
  band: { y: number; height: number }
  /** Stretches of night, 9 pm to 6 am. */
  nights: { x: number; width: number }[]
  worst: { x: number; y: number; hour: number; waterC: number }
  hourMarks: { x: number; hour: number }[]
  degreeMarks: { y: number; degreesC: number }[]
}

/** Drawn to the pixels it gets, so that its words keep their size: `widthPx` beside these. */
export const LINE_VIEW = { height: 220, left: 48, right: 16, top: 12, bottom: 28 } as const
const NIGHT_FROM = 21
const NIGHT_UNTIL = 6
const ROOM_C = 2
const MARK_PX = 64

interface Asked {
  steps: readonly TripStep[]
  /** What the animals may have on the way, °C. */
  rangeC: readonly [number, number]
  /** Hour of the day at the beginning, 0-24. */
  departHour: number
  widthPx: number
}

/** Where everything of a trip line is drawn. null: nothing to draw. */
export function planTripLine({ steps, rangeC, departHour, widthPx }: Asked): LinePlan | null {
  const [first, last] = [steps[0], steps.at(-1)]
  if (!first || !last || last.hour <= 0) return null
  const temperatures = steps.map(({ waterC }) => waterC)
  const [low, high] = rangeC
  const bottomC = Math.floor(Math.min(low, ...temperatures) - ROOM_C)
  const topC = Math.ceil(Math.max(high, ...temperatures) + ROOM_C)
  const { height, left, right, top, bottom } = LINE_VIEW
  const x = (hour: number) => left + (hour / last.hour) * (widthPx - left - right)
  const y = (degreesC: number) => top + ((topC - degreesC) / (topC - bottomC)) * (height - top - bottom)
  const middle = (low + high) / 2
  const worst = steps.reduce((found, step) =>
    Math.abs(step.waterC - middle) > Math.abs(found.waterC - middle) ? step : found,
  )
  return {
    path: steps
      .map(({ hour, waterC }, at) => `${at === 0 ? 'M' : 'L'}${x(hour).toFixed(1)} ${y(waterC).toFixed(1)}`)
      .join(''),
    band: { y: y(high), height: y(low) - y(high) },
    nights: nightsOf(departHour, last.hour).map(([from, until]) => ({
      x: x(from),
      width: x(until) - x(from),
    })),
    worst: { x: x(worst.hour), y: y(worst.waterC), hour: worst.hour, waterC: worst.waterC },
    hourMarks: marksUpTo(last.hour, widthPx).map((hour) => ({ x: x(hour), hour })),
    degreeMarks: [low, high].map((degreesC) => ({ y: y(degreesC), degreesC })),
  }
}

function nightsOf(departHour: number, hours: number): [number, number][] {
  const nights: [number, number][] = []
  for (let day = -1; day * 24 < departHour + hours; day++) {
    const from = Math.max(0, day * 24 + NIGHT_FROM - departHour)
    const until = Math.min(hours, (day + 1) * 24 + NIGHT_UNTIL - departHour)
    if (until > from) nights.push([from, until])
  }
  return nights
}

/** As many marks as there is room for their words, at whole or quarter hours. */
function marksUpTo(hours: number, widthPx: number): number[] {
  const step = [0.25, 0.5, 1, 2, 4, 6, 12].find((one) => hours / one <= widthPx / MARK_PX) ?? 24
  return Array.from({ length: Math.floor(hours / step) + 1 }, (_, at) => at * step)
}
