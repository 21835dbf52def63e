import { ErrorState } from '@/components/ui/error-state'
import { RadioGroup } from '@/components/ui/radio-group'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { useListing } from '@/hooks/use-listings'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printSlot } from '@/shared/times/print-time'

interface Props {
  order: ShownOrder
  value: string
  onChange: (windowId: string) => void
  /** What to do where no other window is open. */
  emptyWords: string
}

/** The other pickup windows of the batch with a place left. */
export function WindowChoice({ order, value, onChange, emptyWords }: Props) {
  const listing = useListing(order.listingId, undefined, true)
  if (listing.isPending) return <SkeletonRows label="Loading pickup times" rows={2} />
  if (!listing.data) {
    return (
      <ErrorState
        level={3}
        title="The pickup times did not load"
        body={`${listing.error.message} The order stays as it is.`}
        onRetry={() => void listing.refetch()}
        isRetrying={listing.isFetching}
      />
    )
  }
  const open = listing.data.windows.filter(
    ({ placesLeft, startsAt }) => placesLeft > 0 && startsAt !== order.slot?.startsAt,
  )
  if (open.length === 0) return <Text tint="muted">{emptyWords}</Text>
  return (
    <RadioGroup
      label="Pickup time"
      value={value}
      onChange={onChange}
      choices={open.map((window) => ({
        value: window.windowId,
        label: printSlot(window),
        hint: `${window.placesLeft} left`,
      }))}
    />
  )
}
