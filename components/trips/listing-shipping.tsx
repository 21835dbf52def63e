import type { ReactNode } from 'react'

import { packingWords } from './packing-words'
import { SeasonStrip } from './season-strip'

import { shipDayNames, shippingBadge } from '@/components/listings/shipping-words'
import { Badge } from '@/components/ui/badge'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import type { ShownListing } from '@/shared/contracts/listings'
import type { ShippedThroughYear } from '@/shared/contracts/shipping'
import { seasonSources } from '@/shared/domain/season/season-classes.facts'
import { printSource } from '@/shared/sources'
import { printCount } from '@/shared/units/count'
import { comingMonday } from '@/shared/times/coming-monday'
import { printCents } from '@/shared/units/money'

interface Props {
  listing: ShownListing
  /** The days to come, below the year. */
  children?: ReactNode
}

/** How a batch may be shipped, and in which weeks it usually arrives alive where the buyer is. */
export function ListingShipping({ listing: { body, shipped, gate }, children }: Props) {
  if (body.category !== 'fish' || !body.shipping) return null
  const { shipping, statesServed } = body
  const days = shipping.days.map((day) => shipDayNames[day]).join(', ')
  return (
    <Card labelledBy="shipping">
      <Heading level={2} size="lead" nativeID="shipping">
        Shipping
      </Heading>
      <Text>
        {`${packingWords[shipping.packing]}, up to ${printCount(shipping.mostInBox)} in a box. ${printCents(shipping.boxCents)} for a packed box and ${printCents(shipping.freightCents)} freight, with ${shipping.carrier}. Leaves on ${days}, to ${statesServed.join(', ')}.${shipping.holdsAtCounter ? ' Can wait for you at the carrier’s counter.' : ''}`}
      </Text>
      {shipped && gate ? (
        <>
          <Badge {...shippingBadge(shipped, gate.buyerState)} />
          {shipped.isServed ? (
            <>
              <YearAhead shipped={shipped} />
              <Text size="note" tint="muted">
                {`The year goes by the weather of many years, not by a forecast: safe in nine of ten such trips. ${seasonSources.map(printSource).join('; ')}.`}
              </Text>
              {children}
            </>
          ) : null}
        </>
      ) : (
        <Text tint="muted">Say where they will live: then we can say in which weeks they arrive well.</Text>
      )}
    </Card>
  )
}

/** From this week on, as the badge counts: its next safe week lies to the right. */
function YearAhead({ shipped: { weeks, week, monday } }: { shipped: ShippedThroughYear }) {
  const ahead = [...weeks.slice(week - 1), ...weeks.slice(0, week - 1)]
  const mondays = ahead.map((_, at) => comingMonday(monday, ((week - 1 + at) % weeks.length) + 1))
  return <SeasonStrip weeks={ahead} mondays={mondays} thisWeek={1} />
}
