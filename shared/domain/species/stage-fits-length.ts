import { stages, type Stage } from '@/shared/domain/species/stages.facts'

const quarterInch = 0.25

/**
 * Whether a size range in inches agrees with the word the seller chose; a quarter inch over an edge is let pass.
 * null: the word says nothing about length (adult, breeder), or is not one of ours.
 */
export function stageFitsLength(stageId: Stage['id'], minIn: number, maxIn: number): boolean | null {
  const stage = stages.find((one) => one.id === stageId)
  if (!stage || (stage.fromIn === null && stage.toIn === null)) return null
  const isLongEnough = stage.fromIn === null || minIn >= stage.fromIn - quarterInch
  const isShortEnough = stage.toIn === null || maxIn <= stage.toIn + quarterInch
  return isLongEnough && isShortEnough
}
