import type { SellerRow } from '@/server/sellers/seller-store'
import type { FieldProblem } from '@/shared/api/problem'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { WormBody } from '@/shared/contracts/worm-lot'
import { findState } from '@/shared/domain/rules/find-state'
import { shipmentOf } from '@/shared/domain/season/shipment-of'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { stageFitsLength } from '@/shared/domain/species/stage-fits-length'

const MM_PER_INCH = 25.4

function animalFaults(body: FishBody): FieldProblem[] {
  const taxon = findTaxon(body.taxonId)
  const pointer = '#/draft/taxonId'
  if (!taxon) return [{ detail: 'Pick the species from the list.', pointer }]
  if (taxon.kind !== 'fish' && taxon.kind !== 'crustacean') {
    return [{ detail: 'This form is for fish, crayfish and prawns.', pointer }]
  }
  if (taxon.rank !== 'species' && taxon.rank !== 'hybrid') {
    return [{ detail: `Which ${taxon.commonName.toLowerCase()}? Pick one species or cross.`, pointer }]
  }
  return []
}

function stageFaults(body: FishBody): FieldProblem[] {
  const fits = stageFitsLength(body.stage, body.sizeLoMm / MM_PER_INCH, body.sizeHiMm / MM_PER_INCH)
  if (fits !== false) return []
  return [
    {
      detail: 'That word does not fit the lengths you gave: choose another stage or check the size.',
      pointer: '#/draft/stage',
    },
  ]
}

/** Living animals go where we trade them, from sellers who have answered for their state. */
export function checkStates(body: FishBody | WormBody, seller: SellerRow): FieldProblem[] {
  const faults: FieldProblem[] = []
  if (!findState(seller.state)?.takesAnimals) {
    faults.push({
      detail: `We do not trade living animals in ${seller.state} yet.`,
      pointer: '#/draft/statesServed',
    })
  }
  body.statesServed.forEach((state, at) => {
    if (!findState(state)?.takesAnimals) {
      faults.push({
        detail: `We bring no living animals to ${state} yet.`,
        pointer: `#/draft/statesServed/${at}`,
      })
    }
  })
  if (!seller.licences.some((licence) => licence.state === seller.state)) {
    faults.push({
      detail: `Answer the licence question for ${seller.state} on your farm page first.`,
      pointer: '#/draft/licenceNumbers',
    })
  }
  return faults
}

/** A batch that search could not judge would only ever be hidden by it. */
function shippingFaults(body: FishBody, { cellLat: lat, cellLng: lng }: SellerRow): FieldProblem[] {
  if (!body.shipping) return []
  const from = { lat, lng }
  const shipment = shipmentOf({ taxonId: body.taxonId, packing: body.shipping.packing, from }, from)
  if (shipment && shipment.origin !== null) return []
  const what = shipment ? 'from your place' : 'for this animal'
  const detail = `We hold no shipping season ${what} yet: leave shipping out for now.`
  return [{ detail, pointer: '#/draft/shipping/packing' }]
}

/** What is wrong with the animal named, its stage, and where it would be sold or shipped. */
export function checkAnimal(body: FishBody, seller: SellerRow): FieldProblem[] {
  return [
    ...animalFaults(body),
    ...stageFaults(body),
    ...checkStates(body, seller),
    ...shippingFaults(body, seller),
  ]
}
