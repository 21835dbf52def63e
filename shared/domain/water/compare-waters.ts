import type { SourceKey } from '@/shared/sources'
import { waterMatch } from '@/shared/domain/water/water-match.facts'
import { roundTo } from '@/shared/units/round-to'

/** °C, pH, and carbonate hardness in ppm as CaCO3. */
export interface Water {
  waterC: number
  pH: number
  khPpm: number
}
export type WaterFigure = keyof Water

/** match: let them go · float: the closed bag in the tank · slowly: step by step · too-far, too-soft: change the tank first */
export type MatchVerdict = 'match' | 'float' | 'slowly' | 'too-far' | 'too-soft'

export interface FigureMatch {
  figure: WaterFigure
  theirs: number
  yours: number
  /** Yours less theirs. */
  difference: number
  verdict: MatchVerdict
  /** How long getting used to it takes; null where there is nothing to wait for, or the tank is changed first. */
  minutes: number | null
  /** What the figure was held against. */
  limit: number
  sourceKeys: readonly SourceKey[]
}

type Judged = Pick<FigureMatch, 'verdict' | 'minutes' | 'limit' | 'sourceKeys'>

/** Figures are typed in °F and °C: the last bits of a conversion decide nothing. */
const EXACT = 0.001
const MINUTES_AN_HOUR = 60

const by = (...limits: { sourceKey: SourceKey }[]): SourceKey[] => [
  ...new Set(limits.map(({ sourceKey }) => sourceKey)),
]

function judgeTemperature(apart: number): Judged {
  const { releaseC, temperFromC, floatC, floatMinutes, ratePerHourC, mostC } = waterMatch
  const published = apart > temperFromC.value ? [temperFromC] : []
  if (apart <= releaseC.value) {
    return { verdict: 'match', minutes: null, limit: releaseC.value, sourceKeys: by(releaseC) }
  }
  if (apart <= floatC.value) {
    const sourceKeys = by(...published, floatC, floatMinutes)
    return { verdict: 'float', minutes: floatMinutes.value, limit: releaseC.value, sourceKeys }
  }
  if (apart <= mostC.value) {
    const minutes = Math.ceil(roundTo((apart / ratePerHourC.value) * MINUTES_AN_HOUR, EXACT))
    return { verdict: 'slowly', minutes, limit: floatC.value, sourceKeys: by(...published, ratePerHourC) }
  }
  return { verdict: 'too-far', minutes: null, limit: mostC.value, sourceKeys: by(...published, mostC) }
}

function judgePH(apart: number): Judged {
  const { releasePH, stepPH, stepMinutes, mostPH } = waterMatch
  if (apart <= releasePH.value) {
    return { verdict: 'match', minutes: null, limit: releasePH.value, sourceKeys: by(releasePH) }
  }
  if (apart <= mostPH.value) {
    const minutes = Math.ceil(roundTo(apart / stepPH.value, EXACT)) * stepMinutes.value
    return { verdict: 'slowly', minutes, limit: releasePH.value, sourceKeys: by(releasePH, stepPH) }
  }
  return { verdict: 'too-far', minutes: null, limit: mostPH.value, sourceKeys: by(mostPH) }
}

function judgeHardness(apart: number, yours: number): Judged {
  const { leastKhPpm, releaseKhPpm } = waterMatch
  if (yours < leastKhPpm.value) {
    return { verdict: 'too-soft', minutes: null, limit: leastKhPpm.value, sourceKeys: by(leastKhPpm) }
  }
  const verdict = apart <= releaseKhPpm.value ? 'match' : 'slowly'
  return { verdict, minutes: null, limit: releaseKhPpm.value, sourceKeys: by(releaseKhPpm) }
}

/** Whether a figure can be one of fresh water that animals live in: 0-45 °C, pH 3-11, 0-1,000 ppm. */
export function isWaterFigure(figure: WaterFigure, value: number): boolean {
  const [least, most] = ({ waterC: [0, 45], pH: [3, 11], khPpm: [0, 1000] } as const)[figure]
  return value >= least && value <= most
}

/**
 * Holds the water the animals come out of against that of a tank, figure by figure; a figure that is not given, or
 * lies outside `isWaterFigure`, is left out.
 */
export function compareWaters(theirs: Water, yours: Partial<Water>): FigureMatch[] {
  const figures: WaterFigure[] = ['waterC', 'pH', 'khPpm']
  return figures.flatMap((figure) => {
    const [from, to] = [theirs[figure], yours[figure]]
    if (to === undefined || !isWaterFigure(figure, from) || !isWaterFigure(figure, to)) return []
    const difference = roundTo(to - from, EXACT)
    const apart = Math.abs(difference)
    const judged =
      figure === 'waterC'
        ? judgeTemperature(apart)
        : figure === 'pH'
          ? judgePH(apart)
          : judgeHardness(apart, to)
    return [{ figure, theirs: from, yours: to, difference, ...judged }]
  })
}
