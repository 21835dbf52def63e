import { boxPackingLines } from './box-packing-words'
import { DayVerdict } from './day-verdict'
import { dayWords, wayWords } from './ship-day-words'

import { Fact } from '@/components/orders/fact'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { useUnits } from '@/hooks/use-units'
import type { ShownRouteCheck, ShownShipment } from '@/shared/contracts/shipments'
import { printMoment } from '@/shared/times/print-time'

const whenChecked: Record<ShownRouteCheck['kind'], string> = {
  reservation: 'when it was ordered',
  evening: 'on the evening before',
  morning: 'on the morning of the day',
  seller: 'by the seller',
}

/** The last look at the way: verdict, when and by what, the worst of it, and how the boxes are packed. */
export function RouteCheckCard({ shipment }: { shipment: ShownShipment }) {
  const units = useUnits()
  const { check, toZone } = shipment
  if (!check) return null
  const isOtherDay = check.shipDay !== shipment.shipDay
  return (
    <Card labelledBy="route-check">
      <Heading level={2} size="lead" nativeID="route-check">
        The way
      </Heading>
      {isOtherDay ? (
        <Text tint="muted">{`This look was for ${dayWords(check.shipDay)}; the agreed day will be looked at anew.`}</Text>
      ) : (
        <Text>{wayWords(shipment)}</Text>
      )}
      <DayVerdict day={check} />
      <Text size="note" tint="muted">
        {`Looked at ${whenChecked[check.kind]}, ${printMoment(check.at, toZone)}.${check.goodUntil ? ` Good for sending until ${printMoment(check.goodUntil, toZone)}.` : ''}`}
      </Text>
      {check.packing
        ? boxPackingLines(check.packing, units).map(({ label, text }) => (
            <Fact key={label} name={label}>
              {text}
            </Fact>
          ))
        : null}
      {check.verdict === 'safe' && !check.packing ? (
        <Text size="note" tint="muted">
          How to pack is decided by the forecast, within a week of the day.
        </Text>
      ) : null}
    </Card>
  )
}
