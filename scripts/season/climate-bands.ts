import { widest, type CellClimate, type WeekAir } from '@/scripts/season/cell-climate'

/** As many classes of weekly low and high as a listing's `lane` has room for. */
export const BANDS = 48

/** Every other week's two days, turned so that the least is the harshest. */
const featuresOf = ({ weeks }: CellClimate): number[] =>
  (weeks[0] ?? []).flatMap(({ cold, hot }, week) =>
    week % 2 === 0 ? [cold.minC, cold.maxC, -hot.minC, -hot.maxC] : [],
  )

interface Point {
  features: readonly number[]
  weight: number
  cell: number
}

interface Split {
  gain: number
  halves: readonly [readonly Point[], readonly Point[]]
}

/**
 * Sorts the cells into bands: again and again the band whose parting saves most is parted, so that what people lose to
 * the harshest member of their band is small. Answers one band a cell, in order; the same way every time.
 */
export function bandsOf(cells: readonly CellClimate[]): number[] {
  const all = cells.map((cell, at) => ({ features: featuresOf(cell), weight: cell.weight, cell: at }))
  const groups: { points: readonly Point[]; split: Split | null }[] = [{ points: all, split: bestSplit(all) }]
  while (groups.length < BANDS) {
    const best = groups.reduce((a, b) => ((b.split?.gain ?? 0) > (a.split?.gain ?? 0) ? b : a))
    if (!best.split) break
    const [left, right] = best.split.halves
    groups.splice(
      groups.indexOf(best),
      1,
      { points: left, split: bestSplit(left) },
      { points: right, split: bestSplit(right) },
    )
  }
  const bands = cells.map(() => 0)
  groups.forEach(({ points }, band) => points.forEach(({ cell }) => (bands[cell] = band)))
  return bands
}

/** The parting along one feature that saves most of Σ weight × (own figure − harshest figure). */
function bestSplit(points: readonly Point[]): Split | null {
  const count = points[0]?.features.length ?? 0
  let best: Split | null = null
  const whole = lossesUpTo(points).at(-1) ?? 0
  for (let feature = 0; feature < count; feature++) {
    const sorted = [...points].sort(
      (a, b) => (a.features[feature] ?? 0) - (b.features[feature] ?? 0) || a.cell - b.cell,
    )
    const [low, high] = [lossesUpTo(sorted), lossesUpTo([...sorted].reverse())]
    for (let cut = 1; cut < sorted.length; cut++) {
      const gain = whole - (low[cut - 1] ?? 0) - (high[sorted.length - cut - 1] ?? 0)
      if (gain > (best?.gain ?? 0)) best = { gain, halves: [sorted.slice(0, cut), sorted.slice(cut)] }
    }
  }
  return best
}

/** For each number of leading points, what they lose together by being judged as the harshest of them. */
function lossesUpTo(points: readonly Point[]): number[] {
  const least = (points[0]?.features ?? []).map(() => Infinity)
  let [weight, own] = [0, 0]
  return points.map(({ features, weight: more }) => {
    weight += more
    let sum = 0
    features.forEach((value, at) => {
      own += more * value
      if (value < (least[at] ?? Infinity)) least[at] = value
      sum += least[at] ?? 0
    })
    return own - weight * sum
  })
}

/** The days of all cells of each band, by nights (1, 2) and week. */
export function bandWeeks(cells: readonly CellClimate[], bands: readonly number[]): WeekAir[][][] {
  return Array.from({ length: BANDS }, (_, band) => {
    const members = cells.filter((_cell, at) => bands[at] === band)
    if (members.length === 0) return []
    return [0, 1].map((nights) =>
      (members[0]?.weeks[nights] ?? []).map((_day, week) =>
        widest(members.flatMap(({ weeks }) => weeks[nights]?.[week] ?? [])),
      ),
    )
  })
}
