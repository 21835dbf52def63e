import type { SellerRow } from '@/server/orders/party-store'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import type { BoxLabel } from '@/server/packing/packing-sheet'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import type { ShipmentPlan } from '@/shared/domain/shipping/plan-shipment'
import { fahrenheitFromC } from '@/shared/units/temperature'

interface Labelled {
  shipment: ShipmentRow
  seller: SellerRow
  plan: ShipmentPlan
  quantity: number
}

const degrees = (degreesC: number) => `${degreesC} °C (${Math.round(fahrenheitFromC(degreesC))} °F)`

function keepBetween({ trip }: ShipmentPlan): string[] {
  const { shipWaterC, shipAirC } = trip.animals.species
  const range = shipWaterC ?? shipAirC
  return range ? [`Keep between ${degrees(range[0])} and ${degrees(range[1])}.`] : []
}

/** One label for each box: what is in it, how it is kept, where it goes and where it comes from. */
export function boxLabels({ shipment, seller, plan, quantity }: Labelled): BoxLabel[] {
  const { address, boxes, deliverTo } = shipment
  const name = plan.trip.animals.species.commonName
  return Array.from({ length: boxes }, (_, at) => {
    const count = Math.max(0, Math.min(plan.animalsPerBox, quantity - plan.animalsPerBox * at))
    return {
      heading: 'LIVE ANIMALS',
      lines: [
        `Box ${at + 1} of ${boxes}: ${count} ${name}`,
        'This side up. Keep out of sun and frost.',
        ...keepBetween(plan),
        ' ',
        'To',
        address.name,
        address.street,
        `${address.city}, ${address.state} ${address.zip}`,
        `Phone ${address.phone}`,
        ...(deliverTo === 'counter' ? ['Hold at the counter for pickup.'] : []),
        ' ',
        'From',
        seller.farmName,
        seller.street,
        `${seller.city}, ${seller.state} ${seller.zip}`,
        `Phone ${seller.phone}`,
        ' ',
        fillCaution('G-1', {}),
      ],
      note: fillCaution('G-14', {}),
    }
  })
}
