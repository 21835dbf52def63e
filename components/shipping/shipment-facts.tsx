import { addressWords, deliverWords } from './shipment-words'
import { dayWords } from './ship-day-words'

import { Fact } from '@/components/orders/fact'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { RoutePaper, ShownShipment } from '@/shared/contracts/shipments'
import { printClock, printLongDay, printMoment } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

const boxesWords = (boxes: number) => (boxes === 1 ? '1 box' : `${boxes} boxes`)

const paperWords = ({ kind, number, issuer, expiresOn }: RoutePaper) =>
  `${kind}: ${number}, by ${issuer}, good until ${printLongDay(`${expiresOn}T12:00:00Z`, 'UTC')}`

function papersWords({ papers, papersNeeded }: ShownShipment): string | null {
  if (papers.length > 0) return papers.map(paperWords).join('; ')
  return papersNeeded.length > 0 ? `Still to be named: ${papersNeeded.join('; ')}` : null
}

interface Props {
  shipment: ShownShipment
  order: Pick<ShownOrder, 'party' | 'money'>
}

/** What leaves when, arrives when and where, with whom. */
export function ShipmentFacts({ shipment, order: { party, money } }: Props) {
  const { shipDay, arriveDay, promisedAt, toZone, boxes, carrier, tracking, address } = shipment
  const papers = papersWords(shipment)
  return (
    <>
      <Fact name="Box and freight">{`${printCents(money.boxCents)} for packing, ${printCents(money.freightCents)} freight`}</Fact>
      <Fact name="Leaves">{`${dayWords(shipDay)}, ${boxesWords(boxes)}`}</Fact>
      <Fact name="Arrives">{`${dayWords(arriveDay)}, promised by ${printClock(promisedAt, toZone)}`}</Fact>
      <Fact name="Handed over">{deliverWords[shipment.deliverTo]}</Fact>
      <Fact name="To">
        {address
          ? addressWords(address)
          : party === 'seller'
            ? 'Shown once the day is agreed'
            : 'The buyer’s address'}
      </Fact>
      {address ? <Fact name="Phone">{address.phone}</Fact> : null}
      <Fact name="Carrier">{carrier}</Fact>
      {tracking ? <Fact name="Tracking">{tracking}</Fact> : null}
      {shipment.dispatchedAt ? <Fact name="Sent">{printMoment(shipment.dispatchedAt, toZone)}</Fact> : null}
      {shipment.arrivedAt ? <Fact name="Arrived">{printMoment(shipment.arrivedAt, toZone)}</Fact> : null}
      {papers ? <Fact name="Papers">{papers}</Fact> : null}
    </>
  )
}
