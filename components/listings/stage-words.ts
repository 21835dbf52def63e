import { stages } from '@/shared/domain/species/stages.facts'

/** "Fingerling" for `fingerling`; '' for a word that is not one of ours. */
export function stageName(stageId: string | undefined): string {
  return stages.find(({ id }) => id === stageId)?.name ?? ''
}
