import { Fragment, type ComponentType, type ReactNode } from 'react'

import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useOwnListing } from '@/hooks/use-own-listings'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

interface Props {
  listingId: string
  /** A form must open with what the server holds now, not with what is remembered. */
  isFresh?: boolean
  /** The page around everything but the children, where those bring their own. */
  frame?: ComponentType<{ children: ReactNode }>
  children: (own: OwnListing) => ReactNode
}

export function OwnListingGate({ listingId, isFresh, frame: Frame = Fragment, children }: Props) {
  const query = useOwnListing(listingId)
  const isKnown = query.data && (!isFresh || query.isFetchedAfterMount)
  if (query.data && isKnown) return children(query.data)
  return (
    <Frame>
      {query.error ? (
        <Fault error={query.error} onRetry={() => void query.refetch()} isRetrying={query.isRefetching} />
      ) : (
        <SkeletonRows label="Loading the listing" rows={5} />
      )}
    </Frame>
  )
}

interface FaultProps {
  error: Error
  onRetry: () => void
  isRetrying: boolean
}

function Fault({ error, onRetry, isRetrying }: FaultProps) {
  if (error instanceof Problem && error.slug === 'not-found') {
    return (
      <EmptyState
        icon="question"
        title="This listing is not here"
        body="It may have been thrown away, or it belongs to another account."
        action={<ButtonLink href="/sell" label="To your listings" />}
      />
    )
  }
  return (
    <ErrorState
      title="We could not load this listing"
      body={error.message}
      onRetry={onRetry}
      isRetrying={isRetrying}
    />
  )
}
