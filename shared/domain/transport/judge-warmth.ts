import type { Animals, Container } from '@/shared/domain/transport/trip'
import type { Reason } from '@/shared/domain/transport/verdict'
import type { WarmthStep } from '@/shared/domain/transport/water-way'
import type { Range } from '@/shared/domain/species/species-record'

/** House rules: a short ride home in open water may be as warm as 2 °C below stress; a change of 10 °C is the most. */
const SHORT_RIDE_H = 4
const BELOW_STRESS_C = 2
const CHANGE_MOST_C = 10
const MARGIN_C = 1

/** Temperatures the animals may have on the way, °C. null: nobody says. */
export function travelRangeC({ species }: Animals, container: Container, hours: number): Range | null {
  const range = container.kind === 'bedding' ? (species.shipAirC ?? species.shipWaterC) : species.shipWaterC
  if (!range || container.kind !== 'vessel' || hours > SHORT_RIDE_H) return range
  return [range[0], Math.max(range[1], species.stressC[1] - BELOW_STRESS_C)]
}

interface Rule {
  code: Reason['code']
  verdict: Reason['verdict']
  limit: number
  fails: (waterC: number) => boolean
}

/** What the temperatures of the way speak for or against. */
export function judgeWarmth(steps: readonly WarmthStep[], range: Range): Reason[] {
  const startC = steps[0]?.waterC ?? NaN
  const first = ({ code, verdict, limit, fails }: Rule) => {
    const step = steps.find(({ waterC }) => fails(waterC))
    return step
      ? [
          {
            code,
            verdict,
            value: step.waterC,
            limit,
            atHour: step.hour,
            sourceKey: 'house-rule',
          } satisfies Reason,
        ]
      : []
  }
  const [low, high] = range
  const cold = first({ code: 'too-cold', verdict: 'unsafe', limit: low, fails: (waterC) => waterC < low })
  const warm = first({ code: 'too-warm', verdict: 'unsafe', limit: high, fails: (waterC) => waterC > high })
  return [
    ...first({ code: 'freezes', verdict: 'unsafe', limit: 0, fails: (waterC) => waterC <= 0 }),
    ...cold,
    ...(cold.length
      ? []
      : first({
          code: 'nearly-too-cold',
          verdict: 'caution',
          limit: low + MARGIN_C,
          fails: (waterC) => waterC < low + MARGIN_C,
        })),
    ...warm,
    ...(warm.length
      ? []
      : first({
          code: 'nearly-too-warm',
          verdict: 'caution',
          limit: high - MARGIN_C,
          fails: (waterC) => waterC > high - MARGIN_C,
        })),
    ...first({
      code: 'changes-too-far',
      verdict: 'unsafe',
      limit: CHANGE_MOST_C,
      fails: (waterC) => Math.abs(waterC - startC) > CHANGE_MOST_C,
    }),
  ]
}
