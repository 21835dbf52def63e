import { packingWords } from '@/components/trips/packing-words'
import { printAnswer } from '@/shared/domain/listings/print-answer'
import { findTaxon } from '@/shared/domain/species/find-taxon'

const choices: Record<string, Record<string, string>> = {
  countMethod: { hand: 'by hand', 'sample-weight': 'by weighed samples', displacement: 'by displacement' },
  sex: { 'all-male': 'all male', unknown: 'not known' },
  origin: { 'hatched-here': 'hatched here', 'grown-on': 'grown on here', 'bought-in': 'bought in' },
  stage: { 'advanced-fingerling': 'advanced fingerling' },
  placeKind: { 'farm-gate': 'at the farm gate', 'public-place': 'at a public place' },
  accept: { ask: 'answers each request', instant: 'at once' },
  balanceDue: { 'at-handover': 'at the pickup', before: '48 hours before' },
  'water.source': { town: 'town water' },
  'shipping.packing': packingWords,
}
const lists = ['tiers', 'windows', 'photos']

/** An answer as the desk reads it. '' is not answered. */
export function answerText(field: string, value: unknown): string {
  return answerWords(field, printAnswer(field, value))
}

/** A printed answer in plain words: species by both names, choices as said, lists a line each. */
export function answerWords(field: string, printed: string): string {
  if (field === 'taxonId') return taxonText(printed)
  if (lists.includes(field)) return printed.replaceAll('; ', '\n')
  return choices[field]?.[printed] ?? printed
}

function taxonText(taxonId: string): string {
  const taxon = findTaxon(taxonId)
  return taxon ? `${taxon.commonName} (${taxon.scientificName})` : taxonId
}
