import { StyleSheet, View } from 'react-native'

import { foundFacts } from '@/components/find/found-facts'
import { Tag } from '@/components/listings/tag'
import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { space } from '@/constants/theme'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useOnSale } from '@/hooks/use-sellers'
import { useUnits } from '@/hooks/use-units'

/** The seller's live listings as tags, newest first. */
export function OnSaleNow({ sellerId }: { sellerId: string }) {
  return (
    <View style={styles.frame}>
      <Heading level={2} size="lead">
        On sale now
      </Heading>
      <Rows sellerId={sellerId} />
    </View>
  )
}

function Rows({ sellerId }: { sellerId: string }) {
  const units = useUnits()
  const { place, isKnown } = useCurrentPlace()
  const query = useOnSale(sellerId, place?.near, isKnown)
  if (query.isPending) return <TagSkeleton label="Loading what is on sale" count={2} />
  if (!query.data) {
    return (
      <ErrorState
        level={3}
        title="We could not load what is on sale"
        body={`${query.error.message.replace(/\.?$/, '.')} Nothing is lost.`}
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const listings = query.data.pages.flatMap((page) => page.items)
  if (listings.length === 0) {
    return (
      <EmptyState
        level={3}
        icon="fish"
        title="Nothing on sale just now"
        body="What they list next appears here by itself."
      />
    )
  }
  const asked = { units, count: undefined, state: place?.state, near: undefined }
  return (
    <>
      <View role="list" aria-label="On sale now" style={styles.list}>
        {listings.map((listing) => (
          <View key={listing.listingId} role="listitem">
            <Tag facts={foundFacts(listing, asked)} size="row" level={3} />
          </View>
        ))}
      </View>
      {query.isFetchNextPageError ? (
        <ErrorState level={3} title="We could not load more" body="Nothing is lost. Try again." />
      ) : null}
      {query.hasNextPage ? (
        <Button
          label="Show more"
          kind="secondary"
          isBusy={query.isFetchingNextPage}
          busyLabel="Loading"
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.md }, list: { gap: space.md } })
