import { printAnswer } from '@/shared/domain/listings/print-answer'
import { findTaxon } from '@/shared/domain/species/find-taxon'

/** An answer as the desk reads it: species by both names, everything else as in the comparison. */
export function answerText(field: string, value: unknown): string {
  return field === 'taxonId' && typeof value === 'string' ? taxonText(value) : printAnswer(field, value)
}

/** "Bluegill (Lepomis macrochirus)"; the id where it is none of ours. */
export function taxonText(taxonId: string): string {
  const taxon = findTaxon(taxonId)
  return taxon ? `${taxon.commonName} (${taxon.scientificName})` : taxonId
}
