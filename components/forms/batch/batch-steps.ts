import type { BatchTyping } from './batch-typing'

export interface BatchStep {
  id: string
  title: string
  /** The first names of the fields that are asked here. */
  fields: readonly (keyof BatchTyping)[]
}

/** The groups of questions, in the order in which they are asked; the check before publishing follows them. */
export const batchSteps: readonly BatchStep[] = [
  {
    id: 'species-size',
    title: 'Species and size',
    fields: [
      'taxonId',
      'strain',
      'sizeLoMm',
      'sizeHiMm',
      'stage',
      'ungraded',
      'hatchedOn',
      'readyOn',
      'sex',
      'sexClaimPct',
    ],
  },
  {
    id: 'count-price',
    title: 'Count and price',
    fields: ['countOnHand', 'countMethod', 'overcountPct', 'minOrder', 'orderStep', 'mostPerBuyer', 'tiers'],
  },
  { id: 'water-health', title: 'Water and health', fields: ['water', 'feed', 'health'] },
  {
    id: 'legal',
    title: 'Legal',
    fields: ['origin', 'originState', 'wildCaught', 'singleSpeciesChecked', 'licenceNumbers', 'statesServed'],
  },
  { id: 'pickup', title: 'Pickup', fields: ['placeKind', 'windows', 'accept', 'balanceDue'] },
  { id: 'shipping', title: 'Shipping (optional)', fields: ['shipping'] },
  { id: 'promise', title: 'Deposit and promise', fields: ['depositPct', 'freeCancelHours', 'promise'] },
  { id: 'photos', title: 'Photos', fields: ['photos', 'words'] },
]

export const checkStep = batchSteps.length

/** Which step asks for a field, by its full name ("tiers.1.unitCents"). The check itself where none does. */
export function stepOfField(name: string): number {
  const [first] = name.split('.')
  const at = batchSteps.findIndex((step) => step.fields.some((field) => field === first))
  return at === -1 ? checkStep : at
}
