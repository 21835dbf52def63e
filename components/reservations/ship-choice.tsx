import { AddressFields } from './address-fields'
import { isShippedHere, notServedWords } from './reservation'
import type { Reservation } from './use-reservation'

import { ShipDays } from '@/components/shipping/ship-days'
import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { RadioGroup } from '@/components/ui/radio-group'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import type { BatchShipping } from '@/shared/contracts/fish-batch'

/** Where the box goes, on which day it leaves, and who takes it in. */
export function ShipChoice({ form }: { form: Reservation }) {
  const { listing } = form
  const { body } = listing
  if (body.category !== 'fish' || !body.shipping) return null
  const { shipping, statesServed } = body
  return (
    <>
      <Card labelledBy="ship-to">
        <Heading level={2} size="lead" nativeID="ship-to">
          Where does the box go?
        </Heading>
        <AddressFields
          address={form.address}
          onChange={form.setAddress}
          states={statesServed}
          errorAt={form.errorAt}
        />
        <DeliverTo form={form} shipping={shipping} />
      </Card>
      <Card labelledBy="ship-when">
        <Heading level={2} size="lead" nativeID="ship-when">
          When does it leave?
        </Heading>
        <Days form={form} />
      </Card>
    </>
  )
}

function DeliverTo({ form, shipping }: { form: Reservation; shipping: BatchShipping }) {
  if (!shipping.holdsAtCounter) {
    return (
      <Text size="note" tint="muted">
        {`Delivered to the door by ${shipping.carrier}. Be there when it comes: a box on a porch freezes or cooks.`}
      </Text>
    )
  }
  return (
    <RadioGroup
      label="Handed to you"
      fieldId="ship-deliver-to"
      value={form.deliverTo}
      onChange={form.setDeliverTo}
      choices={[
        {
          value: 'counter',
          label: 'At the carrier’s counter (recommended)',
          hint: 'The box waits indoors instead of on a porch or in a hot van. Collect it in the morning.',
        },
        {
          value: 'door',
          label: 'At the door',
          hint: 'Somebody must be there when it comes. The first try counts as delivered.',
        },
      ]}
    />
  )
}

function Days({ form }: { form: Reservation }) {
  const { zip, isSure, atAddress, quote, listing } = form
  if (zip === undefined) {
    return <Text tint="muted">Type the ZIP code above: then we look at every way and its weather.</Text>
  }
  if (quote === null) return <Text tint="muted">Say how many: then the days appear.</Text>
  if (!isSure) {
    return atAddress.isError ? (
      <ErrorState
        level={3}
        title="We could not look at this ZIP code"
        body={`${atAddress.error.message} What you typed is kept.`}
        onRetry={() => void atAddress.refetch()}
        isRetrying={atAddress.isFetching}
      />
    ) : (
      <SkeletonRows label="Looking at the way" rows={2} />
    )
  }
  if (!isShippedHere(listing)) {
    return (
      <Banner tone="caution" title="Not shipped there" isLive>
        {notServedWords(listing)}
      </Banner>
    )
  }
  return (
    <ShipDays
      query={form.shipDays}
      value={form.shipDay}
      onChange={form.setShipDay}
      error={form.errorAt('ship-day')}
    />
  )
}
