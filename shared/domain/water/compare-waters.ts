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
  /** Where limit and pace come from. */
  sourceKey: SourceKey
  /** Who has published that animals must get used to so great a difference; null: nobody that we have read. */
  needSourceKey: SourceKey | null
}

type Judged = Pick<FigureMatch, 'verdict' | 'minutes' | 'limit' | 'sourceKey'>

/** Figures are typed in °F and °C: the last bits of a conversion decide nothing. */
const EXACT = 0.001
const MINUTES_AN_HOUR = 60

const judged = (
  verdict: MatchVerdict,
  { value: limit, sourceKey }: { value: number; sourceKey: SourceKey },
  minutes: number | null = null,
): Judged => ({ verdict, minutes, limit, sourceKey })

function judgeTemperature(apart: number): Judged {
  const { releaseC, floatC, floatMinutes, ratePerHourC, mostC } = waterMatch
  if (apart <= releaseC.value) return judged('match', releaseC)
  if (apart <= floatC.value) return judged('float', releaseC, floatMinutes.value)
  if (apart > mostC.value) return judged('too-far', mostC)
  return judged('slowly', floatC, Math.ceil(roundTo((apart / ratePerHourC.value) * MINUTES_AN_HOUR, EXACT)))
}

function judgePH(apart: number): Judged {
  const { releasePH, stepPH, stepMinutes, mostPH } = waterMatch
  if (apart <= releasePH.value) return judged('match', releasePH)
  if (apart > mostPH.value) return judged('too-far', mostPH)
  return judged('slowly', releasePH, Math.ceil(roundTo(apart / stepPH.value, EXACT)) * stepMinutes.value)
}

function judgeHardness(apart: number, yours: number): Judged {
  const { leastKhPpm, releaseKhPpm } = waterMatch
  if (yours < leastKhPpm.value) return judged('too-soft', leastKhPpm)
  return judged(apart <= releaseKhPpm.value ? 'match' : 'slowly', releaseKhPpm)
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
    const judgement = {
      waterC: () => judgeTemperature(apart),
      pH: () => judgePH(apart),
      khPpm: () => judgeHardness(apart, to),
    }[figure]()
    const { value, sourceKey } = waterMatch.temperFromC
    const needSourceKey = figure === 'waterC' && apart > value ? sourceKey : null
    return [{ figure, theirs: from, yours: to, difference, needSourceKey, ...judgement }]
  })
}
