import { useRouter } from 'expo-router'
import { useState } from 'react'

import { GateStatements } from '@/components/reservations/gate-statements'
import { PaySummary } from '@/components/reservations/pay-summary'
import { quoteReservation, reservationErrors } from '@/components/reservations/reservation'
import { ReserveProblem } from '@/components/reservations/reserve-problem'
import { goToPayment } from '@/components/orders/go-to-payment'
import { PlaceField } from '@/components/places/place-field'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { newRequestKey } from '@/hooks/request-key'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useReserveBatch } from '@/hooks/use-orders'
import { Problem } from '@/shared/api/problem'
import type { ShownListing } from '@/shared/contracts/listings'
import { mayPayInFull } from '@/shared/domain/orders/pay-in-full'
import { printSlot } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

/** The answer was lost, or the first press is still being worked on: it may hold animals already. */
const isOutcomeUnknown = (error: Error) =>
  !(error instanceof Problem) || error.status >= 500 || error.slug === 'key-running'

interface Props {
  listing: ShownListing
  count: string | undefined
}

export function ReserveBatchForm({ listing, count }: Props) {
  const router = useRouter()
  const { place, choose } = useCurrentPlace()
  const [key, setKey] = useState(newRequestKey)
  const [openedAtMs] = useState(() => Date.now())
  const [attempt, setAttempt] = useState(0)
  const [quantityText, setQuantity] = useState(count ?? String(listing.body.minOrder))
  const open = listing.windows.filter((window) => window.placesLeft > 0)
  const [windowId, setWindow] = useState(open.length === 1 ? (open[0]?.windowId ?? '') : '')
  const [payMode, setPayMode] = useState<'deposit' | 'full'>('deposit')
  const [ticked, setTicked] = useState<readonly string[]>([])
  const reserve = useReserveBatch(listing.listingId, key)

  const quote = quoteReservation(listing, quantityText)
  const slot = open.find((window) => window.windowId === windowId)
  const mayFull =
    quote !== null &&
    quote.balanceCents > 0 &&
    mayPayInFull({
      totalCents: quote.totalCents,
      nowMs: openedAtMs,
      slotStartMs: slot ? Date.parse(slot.startsAt) : null,
    })
  const mode = mayFull ? payMode : 'deposit'
  const errors = reservationErrors(listing, {
    quantityText,
    windowId,
    payMode,
    ticked,
    hasPlace: place !== null,
  })
  const shown = attempt > 0 ? errors : []
  const errorAt = (fieldId: string) => shown.find((one) => one.fieldId === fieldId)?.message

  const send = () => {
    setAttempt(attempt + 1)
    if (errors.length > 0 || !quote || !place) return
    reserve.mutate(
      {
        quantity: quote.quantity,
        ...(windowId ? { windowId } : {}),
        payMode: mode,
        near: place.near,
        ticked: [...ticked],
        version: listing.version,
      },
      {
        onSuccess: (order) => {
          // The way back from the payment page leads to the hold, not to this form, which would hold once more.
          router.replace(`/orders/${order.orderId}`)
          if (order.payUrl) goToPayment(order.payUrl)
        },
        // Another try with other values is another act; while the outcome is unknown the same key finds the same order.
        onError: (error) => !isOutcomeUnknown(error) && setKey(newRequestKey()),
      },
    )
  }

  return (
    <>
      <ErrorSummary errors={shown} attempt={attempt} />
      <Card>
        <NumberField
          label="How many"
          fieldId="quantity"
          value={quantityText}
          onChangeText={setQuantity}
          hint={`From ${listing.body.minOrder}, in steps of ${listing.body.orderStep}; ${listing.free} left`}
          error={errorAt('quantity')}
        />
        <PlaceField
          label="Where will they live?"
          hint="Rules differ by state. Only the area is kept."
          placeLabel={place?.label ?? ''}
          onChoose={choose}
          fieldId="place"
        />
        {open.length > 0 ? (
          <RadioGroup
            label="Pickup time"
            fieldId="window"
            value={windowId}
            onChange={setWindow}
            choices={open.map((window) => ({
              value: window.windowId,
              label: printSlot(window),
              hint: `${window.placesLeft} ${window.placesLeft === 1 ? 'place' : 'places'} left`,
            }))}
            error={errorAt('window')}
          />
        ) : null}
      </Card>
      {listing.gate ? (
        <GateStatements gate={listing.gate} ticked={ticked} onChange={setTicked} errorAt={errorAt} />
      ) : null}
      {quote ? (
        <PaySummary listing={listing} quote={quote} mode={mode} mayFull={mayFull} onMode={setPayMode} />
      ) : null}
      <ReserveProblem error={reserve.error} listingId={listing.listingId} />
      <Button
        label={
          quote
            ? `Hold ${quote.quantity} and pay ${printCents(mode === 'full' ? quote.totalCents : quote.depositCents)}`
            : 'Hold them'
        }
        icon="check"
        isWide
        isBusy={reserve.isPending}
        busyLabel="Holding them for you"
        onPress={send}
      />
    </>
  )
}
