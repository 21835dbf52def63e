import { StyleSheet, View } from 'react-native'

import { Fact } from '@/components/orders/fact'
import { ShipmentFacts } from '@/components/shipping/shipment-facts'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { space } from '@/constants/theme'
import { calendarUrl } from '@/hooks/api'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printSlot } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

const mapLink = ({ street, city, state, zip }: NonNullable<ShownOrder['meeting']>) =>
  `geo:0,0?q=${encodeURIComponent(`${street}, ${city}, ${state} ${zip}`)}`

/** When, where, who and how much: what the two parties agreed on. */
export function OrderFacts({ order }: { order: ShownOrder }) {
  const { meeting, slot, party } = order
  const isOver = order.state === 'cancelled' || order.state === 'settled'
  const where = meeting ? `${meeting.street}, ${meeting.city}, ${meeting.state} ${meeting.zip}` : null
  const place =
    party === 'seller' ? 'Your place' : (where ?? (isOver ? null : 'Shown once the day is agreed'))
  return (
    <Card labelledBy="order-facts">
      <Heading level={2} size="lead" nativeID="order-facts">
        The agreement
      </Heading>
      <Fact name="Animals">{`${order.quantity} at ${printCents(order.unitCents)} each`}</Fact>
      {order.shipment ? (
        <ShipmentFacts shipment={order.shipment} order={order} />
      ) : (
        <>
          <Fact name="Pickup">{slot ? printSlot(slot) : 'No day agreed yet'}</Fact>
          {place ? <Fact name="Place">{place}</Fact> : null}
        </>
      )}
      {meeting && party === 'buyer' ? <Fact name="Phone">{meeting.phone}</Fact> : null}
      <Fact name={party === 'seller' ? 'Buyer' : 'Seller'}>{order.otherParty.name}</Fact>
      <Fact name="Arrival promise">{order.arrivalPromise}</Fact>
      {order.countHandedOver === undefined ? null : (
        <Fact name="Counted together">{String(order.countHandedOver)}</Fact>
      )}
      <View style={styles.links}>
        {meeting && party === 'buyer' ? (
          <Link href={mapLink(meeting) as `geo:${string}`} isExternal>
            Open in maps
          </Link>
        ) : null}
        {slot && meeting ? (
          <Link href={calendarUrl(order.orderId) as `https:${string}`} isExternal>
            Add to calendar
          </Link>
        ) : null}
        <Link href={`/listings/${order.listingId}`}>See the listing</Link>
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({
  links: { flexDirection: 'row', gap: space.xl, flexWrap: 'wrap' },
})
