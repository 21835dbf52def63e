import { findTaxon } from '@/shared/domain/species/find-taxon'
import { stages } from '@/shared/domain/species/stages.facts'

interface Named {
  taxonId: string
  strain?: string | undefined
  stage: string
}

function many(stageId: string): string {
  const name = stages.find((stage) => stage.id === stageId)?.name.toLowerCase() ?? ''
  return name === '' || name === 'fry' ? name : `${name}s`
}

/** 'Nile tilapia fingerlings', with the strain where one is named. Without the size: that is printed in the reader's units. */
export function listingTitle({ taxonId, strain, stage }: Named): string {
  const name = findTaxon(taxonId)?.commonName ?? 'Fish'
  return [name, strain ? `(${strain})` : '', many(stage)].filter(Boolean).join(' ')
}
