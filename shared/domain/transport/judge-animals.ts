import { oxygenStandIns } from '@/shared/domain/animals/stand-ins.facts'
import type { Animals, Container } from '@/shared/domain/transport/trip'
import type { Reason } from '@/shared/domain/transport/verdict'

/** Catfish of 4 to 10 in puncture bags (catfish extension text); doubled bags are watched, single ones refused. */
const SPINES_MM = [101.6, 254] as const
/** House rule: crayfish keep a day out of water when damp and cool. */
const DAMP_SURE_H = 24

const remark = (code: Reason['code'], verdict: Reason['verdict'], figures: Partial<Reason> = {}): Reason => ({
  code,
  verdict,
  value: null,
  limit: null,
  atHour: null,
  sourceKey: 'house-rule',
  ...figures,
})

/** What kind, sizes and fasting of the animals speak against, whatever the weather. */
export function judgeAnimals(animals: Animals, container: Container, hours: number): Reason[] {
  return [
    ...judgeKind(animals, container, hours),
    ...judgeSpines(animals, container),
    ...judgeSizes(animals),
    ...judgeFasting(animals),
    ...(container.kind !== 'bedding' && oxygenStandIns[animals.species.id]
      ? [remark('stand-in-model', 'safe', { sourceKey: 'fb4-2017' })]
      : []),
  ]
}

function judgeKind({ species: { travels } }: Animals, container: Container, hours: number): Reason[] {
  if (container.kind === 'bedding') {
    if (travels === 'in-water') return [remark('needs-water', 'unsafe')]
    if (travels === 'damp' && hours > DAMP_SURE_H) {
      return [remark('damp-for-long', 'unknown', { value: hours, limit: DAMP_SURE_H, atHour: DAMP_SURE_H })]
    }
    return []
  }
  return travels === 'in-water' ? [] : [remark('needs-damp', 'unsafe')]
}

function judgeSpines({ species, longestMm, shortestMm }: Animals, container: Container): Reason[] {
  if (species.id !== 'channel_catfish' || container.kind !== 'bags' || longestMm === null) return []
  if (longestMm < SPINES_MM[0] || (shortestMm ?? longestMm) > SPINES_MM[1]) return []
  const verdict = container.isDoubled ? 'caution' : 'unsafe'
  return [
    remark('spines-puncture', verdict, {
      value: longestMm,
      limit: SPINES_MM[0],
      sourceKey: 'dupree-huner-1984',
    }),
  ]
}

function judgeSizes({ species: { sizeRatioMost }, shortestMm, longestMm }: Animals): Reason[] {
  if (sizeRatioMost === null || shortestMm === null || longestMm === null) return []
  const value = longestMm / shortestMm
  // 3 in over 2 in is 1.5, whatever the last digit of the millimetres says.
  return value > sizeRatioMost + 1e-9
    ? [remark('sizes-too-mixed', 'caution', { value, limit: sizeRatioMost })]
    : []
}

function judgeFasting({ species: { fastHours }, fastedHours }: Animals): Reason[] {
  if (fastHours === null) return []
  if (fastedHours === null) return [remark('fasting-unsaid', 'safe', { limit: fastHours })]
  return fastedHours < fastHours
    ? [remark('not-fasted', 'caution', { value: fastedHours, limit: fastHours })]
    : []
}
