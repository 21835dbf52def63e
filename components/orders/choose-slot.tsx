import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { ErrorState } from '@/components/ui/error-state'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { useListing } from '@/hooks/use-listings'
import { useWordyAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printSlot } from '@/shared/times/print-time'

/** Another published window with a place left. */
export function ChooseSlot({ order, onClose }: { order: ShownOrder; onClose: () => void }) {
  const listing = useListing(order.listingId, undefined, true)
  const [windowId, setWindow] = useState('')
  const move = useWordyAct('chooseSlot', order.orderId)
  const open = (listing.data?.windows ?? []).filter(
    (window) => window.placesLeft > 0 && window.startsAt !== order.slot?.startsAt,
  )
  return (
    <Sheet
      title={order.state === 'deposit_paid' ? 'Agree on a day' : 'Move to another day'}
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Take this time"
          isWide
          isDisabled={windowId === ''}
          isBusy={move.isPending}
          busyLabel="Moving"
          onPress={() => move.mutate({ windowId }, { onSuccess: onClose })}
        />
      }
    >
      <ActFailed error={move.error} />
      {listing.isPending ? <SkeletonRows label="Loading pickup times" rows={3} /> : null}
      {listing.isError && !listing.data ? (
        <ErrorState
          title="The pickup times did not load"
          body={`${listing.error.message} The day you have stays as it is.`}
          onRetry={() => void listing.refetch()}
          isRetrying={listing.isFetching}
        />
      ) : null}
      {listing.data && open.length === 0 ? (
        <Text>There is no other pickup time at the moment. Ask the seller to offer one.</Text>
      ) : null}
      {open.length > 0 ? (
        <RadioGroup
          label="Pickup time"
          hint={order.state === 'ready' ? 'Each side may move the day once.' : undefined}
          value={windowId}
          onChange={setWindow}
          choices={open.map((window) => ({
            value: window.windowId,
            label: printSlot(window),
            hint: `${window.placesLeft} left`,
          }))}
        />
      ) : null}
    </Sheet>
  )
}
