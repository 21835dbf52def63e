import { describeListing } from '@/server/listings/describe-listing'
import type { OrderShipped } from '@/server/shipping/order-shipped'
import type { MovementFacts } from '@/shared/contracts/shipments'
import { printDateOfYear } from '@/shared/domain/calendar/print-date'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { printLengthRange } from '@/shared/units/length'

interface Leaving extends Omit<OrderShipped, 'party'> {
  tracking: string
  at: Date
}

/** The paper that travels with the animals, as it stands when the box leaves; it is kept and never written anew. */
export function movementFactsOf({ order, shipment, terms, seller, tracking, at }: Leaving): MovementFacts {
  const { address, papers, boxes, carrier } = shipment
  const taxon = findTaxon(terms.taxonId)
  const { title } = describeListing(terms)
  return {
    number: order.publicId,
    at: at.toISOString(),
    seller: {
      name: seller.farmName,
      licences: terms.licenceNumbers,
      address: `${seller.street}, ${seller.city}, ${seller.state} ${seller.zip}`,
    },
    buyer: {
      name: address.name,
      address: `${address.street}, ${address.city}, ${address.state} ${address.zip}`,
    },
    permits: papers,
    commonName: taxon?.commonName ?? title,
    scientificName: taxon?.scientificName ?? '',
    size: printLengthRange({ minCm: terms.sizeLoMm / 10, maxCm: terms.sizeHiMm / 10 }, 'us'),
    count: order.quantity,
    ...{ boxes, carrier, tracking },
    batch: `${title}, hatched ${printDateOfYear(terms.hatchedOn)}`,
    notForRelease: fillCaution('G-1', {}),
  }
}
