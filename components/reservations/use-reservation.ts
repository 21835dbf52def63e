import { useRouter } from 'expo-router'
import { useState } from 'react'

import { isShippedHere, quoteReservation, reservationErrors, type Way } from './reservation'
import { blankAddress, isZip, trimmedAddress, type AddressTyping } from './ship-address'

import { goToPayment } from '@/components/orders/go-to-payment'
import { newRequestKey } from '@/hooks/request-key'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useListing } from '@/hooks/use-listings'
import { useReserveBatch } from '@/hooks/use-orders'
import { useShipDays } from '@/hooks/use-ship-days'
import { Problem } from '@/shared/api/problem'
import type { ShownListing } from '@/shared/contracts/listings'
import { shippingOf } from '@/shared/domain/listings/shipping-of'
import { statesServed } from '@/shared/domain/listings/states-served'
import { mayPayInFull } from '@/shared/domain/orders/pay-in-full'

/** The answer was lost, or the first press is still being worked on: it may hold animals already. */
const isOutcomeUnknown = (error: Error) =>
  !(error instanceof Problem) || error.status >= 500 || error.slug === 'key-running'

// The end of the day: what is paid in full is offered rather too seldom than refused afterwards.
const latestMs = (day: string) => Date.parse(`${day}T23:59:00Z`)

interface Asked {
  listing: ShownListing
  count: string | undefined
  wantedWay: Way
}

/** Everything typed into the reservation, what it comes to, what is missing, and how it is sent. */
export function useReservation({ listing: opened, count, wantedWay }: Asked) {
  const router = useRouter()
  const { place, choose } = useCurrentPlace()
  const [key, setKey] = useState(newRequestKey)
  const [openedAtMs] = useState(() => Date.now())
  const [attempt, setAttempt] = useState(0)
  const [quantityText, setQuantity] = useState(count ?? String(opened.body.minOrder))
  const [chosenWay, setWay] = useState<Way>(wantedWay)
  const open = opened.windows.filter((window) => window.placesLeft > 0)
  const [windowId, setWindow] = useState(open.length === 1 ? (open[0]?.windowId ?? '') : '')
  const [shipDay, setShipDay] = useState('')
  const [deliverTo, setDeliverTo] = useState<'door' | 'counter'>(
    shippingOf(opened.body)?.holdsAtCounter ? 'counter' : 'door',
  )
  const near = place?.near ?? ''
  const served = statesServed(opened.body)
  const onlyState = served?.length === 1 ? served[0] : undefined
  const [typedAddress, setAddress] = useState<AddressTyping | null>(null)
  // The place searched for comes late for a member who has just signed in: it fills the form until something is typed.
  const address = typedAddress ?? blankAddress(isZip(near) ? near : '', onlyState ?? place?.state ?? '')
  const [payMode, setPayMode] = useState<'deposit' | 'full'>('deposit')
  const [ticked, setTicked] = useState<readonly string[]>([])
  const reserve = useReserveBatch(opened.listingId, key)

  const mayShip = isShippedHere(opened)
  const way: Way = mayShip ? chosenWay : 'collect'
  const zip = way === 'ship' && isZip(address.zip.trim()) ? address.zip.trim() : undefined
  // The ZIP of the address decides which rules and which weather count, not the place searched for.
  const atAddress = useListing(opened.listingId, zip, zip !== undefined)
  const isSure = zip === undefined || (atAddress.isSuccess && !atAddress.isPlaceholderData)
  const listing = zip !== undefined && isSure && atAddress.data ? atAddress.data : opened
  const quote = quoteReservation(listing, quantityText, way)
  const isServed = isSure && isShippedHere(listing)
  const shipDays = useShipDays({
    listingId: opened.listingId,
    near: isServed ? zip : undefined,
    quantity: quote?.quantity ?? null,
  })
  const offered = zip !== undefined && isServed && shipDays.data ? shipDays.data.days : null

  const slotStartMs =
    way === 'ship'
      ? shipDay
        ? latestMs(shipDay)
        : null
      : Date.parse(open.find((window) => window.windowId === windowId)?.startsAt ?? '') || null
  const mayFull =
    quote !== null &&
    quote.balanceCents > 0 &&
    mayPayInFull({ totalCents: quote.totalCents, nowMs: openedAtMs, slotStartMs })
  const mode = mayFull ? payMode : 'deposit'
  const errors = reservationErrors(listing, {
    ...{ quantityText, way, windowId, shipDay, address, payMode, ticked, offered },
    hasPlace: place !== null,
  })
  const shown = attempt > 0 ? errors : []

  const send = () => {
    setAttempt(attempt + 1)
    const to = way === 'ship' ? zip : place?.near
    if (errors.length > 0 || !quote || to === undefined) return
    reserve.mutate(
      {
        quantity: quote.quantity,
        ...(way === 'collect' && windowId ? { windowId } : {}),
        ...(way === 'ship' ? { ship: { shipDay, deliverTo, address: trimmedAddress(address) } } : {}),
        payMode: mode,
        near: to,
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

  return {
    ...{ listing, quote, mayShip, way, setWay, open, windowId, setWindow, place, choose },
    ...{ quantityText, setQuantity, address, setAddress, deliverTo, setDeliverTo, shipDay, setShipDay },
    ...{ shipDays, zip, isSure, isServed, atAddress, ticked, setTicked, mode, mayFull, setPayMode },
    ...{ attempt, shown, send, reserve },
    errorAt: (fieldId: string) => shown.find((one) => one.fieldId === fieldId)?.message,
  }
}
export type Reservation = ReturnType<typeof useReservation>
