import { lazy } from 'react'

import { NoConnection } from '@/components/listings/no-connection'
import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useSeller } from '@/hooks/use-sellers'

const SellerStory = lazy(() =>
  import('@/components/listings/listing-group').then((group) => ({ default: group.SellerStory })),
)
const SellerFault = lazy(() =>
  import('@/components/listings/listing-group').then((group) => ({ default: group.SellerFault })),
)

/** One page from loading to loaded, so that its heading is not announced twice. */
export function SellerScreen({ sellerId }: { sellerId: string }) {
  const { data: seller, isError, isPaused, error, isFetching, refetch } = useSeller(sellerId)
  return (
    <Page
      title={seller?.farmName ?? 'Grower'}
      isHeadingHidden={!seller}
      intro={
        seller ? `${seller.kind === 'hatchery' ? 'Hatchery' : 'Grower'} in ${seller.placeText}` : undefined
      }
      back={{ label: 'Back', href: '/' }}
      width="readable"
    >
      <LazyPart label="Loading the grower’s page">
        {seller ? <SellerStory seller={seller} /> : null}
        {!seller && isError ? (
          <SellerFault error={error} onRetry={() => void refetch()} isRetrying={isFetching} />
        ) : null}
        {!seller && !isError && isPaused ? (
          <NoConnection kept="Nothing is lost." onRetry={() => void refetch()} />
        ) : null}
        {!seller && !isError && !isPaused ? (
          <SkeletonRows label="Loading the grower’s page" rows={2} />
        ) : null}
      </LazyPart>
    </Page>
  )
}
