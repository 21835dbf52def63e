import { useState } from 'react'

import { DriveAnswer } from './drive-answer'
import { DriveFields, type Typed } from './drive-fields'

import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { useWayHome } from '@/hooks/use-way-home'
import type { ShownListing } from '@/shared/contracts/listings'
import { dayInZone } from '@/shared/times/day-in-zone'

interface Props {
  listing: ShownListing
  count: number
  /** ZIP or cell of the buyer; undefined: nobody has said. */
  near: string | undefined
}

/** Whether these animals, this many, survive the drive home from here on the day of the pickup. */
export function TripCheck({ listing, count, near }: Props) {
  const [isOpen, setIsOpen] = useState(false)
  return (
    <Card labelledBy="trip-check">
      <Heading level={2} size="lead" nativeID="trip-check">
        The drive home
      </Heading>
      <Text>
        Will they arrive well in what you bring? Reckoned from how far it is, what the weather usually is, and
        how much oxygen they use.
      </Text>
      {near === undefined ? (
        <Text tint="muted">Say where they will live: then the way is known.</Text>
      ) : isOpen ? (
        <OpenCheck listing={listing} count={count} near={near} />
      ) : (
        <Button kind="secondary" icon="thermometer" label="Check the drive" onPress={() => setIsOpen(true)} />
      )}
    </Card>
  )
}

function OpenCheck({ listing, count, near }: Props & { near: string }) {
  const [typed, setTyped] = useState<Typed>({})
  const window = listing.windows.find(({ windowId }) => windowId === typed.windowId) ?? listing.windows[0]
  const day = window ? dayInZone(window.startsAt, window.zone) : new Date().toISOString().slice(0, 10)
  const way = useWayHome(listing.listingId, near, day)
  if (way.isPending) return <SkeletonRows label="Loading the way and its weather" rows={2} />
  if (!way.data) {
    return (
      <ErrorState
        title="The way could not be loaded"
        body={way.error.message}
        onRetry={() => void way.refetch()}
        isRetrying={way.isFetching}
      />
    )
  }
  return (
    <>
      <DriveFields listing={listing} distanceKm={way.data.distanceKm} typed={typed} onTyped={setTyped} />
      <DriveAnswer listing={listing} count={count} way={way.data} typed={typed} window={window} />
    </>
  )
}
