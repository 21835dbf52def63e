import type { Way } from '@/components/reservations/reservation'
import { ReserveBatchForm } from '@/components/reservations/reserve-batch-form'
import { Page } from '@/components/layout/page'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useListing } from '@/hooks/use-listings'
import { useMe } from '@/hooks/use-me'
import { Problem } from '@/shared/api/problem'

interface Props {
  listingId: string
  /** From the listing page's count field. */
  count: string | undefined
  /** What was chosen there: collected, where the link says nothing. */
  way: Way
}

/** The step between a listing and its payment page: how many, when, under which statements, for how much. */
export function ReserveBatch({ listingId, count, way }: Props) {
  const { place, isKnown } = useCurrentPlace()
  const { me, isPending: isAsking } = useMe()
  const listing = useListing(listingId, place?.near, isKnown)
  const back = { label: 'Back to the listing', href: `/listings/${listingId}` } as const
  const title = listing.data ? `Hold ${listing.data.title}` : 'Hold animals'

  if (isAsking || !isKnown || listing.isPending) {
    return (
      <Page title={title} back={back} width="readable">
        <SkeletonRows label="Loading the reservation" rows={5} />
      </Page>
    )
  }
  if (!listing.data) {
    const isGone = listing.error instanceof Problem && listing.error.status === 404
    return (
      <Page title="Hold animals" back={{ label: 'Find', href: '/' }} width="readable">
        <ErrorState
          title={isGone ? 'This listing is gone' : 'We could not load this listing'}
          body={isGone ? 'Look for another near you.' : (listing.error?.message ?? '')}
          onRetry={isGone ? undefined : () => void listing.refetch()}
          isRetrying={listing.isRefetching}
        />
      </Page>
    )
  }
  if (!me) {
    const chosen = new URLSearchParams({ ...(count ? { count } : {}), ...(way === 'ship' ? { way } : {}) })
    const returnTo = encodeURIComponent(`/listings/${listingId}/reserve?${chosen}`)
    return (
      <Page title={title} back={back} width="readable">
        <EmptyState
          title="Sign in to hold animals"
          body="An account keeps your order, your pickup time and your money safe. What you chose is kept."
          action={<ButtonLink label="Sign in" href={`/sign-in?returnTo=${returnTo}`} />}
        />
      </Page>
    )
  }
  return (
    <Page title={title} back={back} width="readable">
      <ReserveBatchForm key={listing.data.version} listing={listing.data} count={count} wantedWay={way} />
    </Page>
  )
}
