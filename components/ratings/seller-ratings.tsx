import { StyleSheet, View } from 'react-native'

import { HideWords } from './hide-words'
import { ShownRatingCard } from './shown-rating'

import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { space } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import { useSellerRatings } from '@/hooks/use-ratings'

/** Every rating of a seller with its reply, newest first. */
export function SellerRatings({ sellerId }: { sellerId: string }) {
  return (
    <View style={styles.list}>
      <Heading level={2} size="lead">
        Ratings
      </Heading>
      <Rows sellerId={sellerId} />
    </View>
  )
}

function Rows({ sellerId }: { sellerId: string }) {
  const { me } = useMe()
  const query = useSellerRatings(sellerId)
  if (query.isPending) return <SkeletonRows label="Loading the ratings" rows={2} />
  if (!query.data) {
    return (
      <ErrorState
        level={3}
        title="We could not load the ratings"
        body={`${query.error.message.replace(/\.?$/, '.')} Nothing is lost.`}
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const ratings = query.data.pages.flatMap((page) => page.items)
  if (ratings.length === 0) {
    return (
      <EmptyState
        level={3}
        icon="star"
        title="No ratings yet"
        body="Buyers can rate once their animals have been handed over."
      />
    )
  }
  const isStaff = me?.roles.some((role) => role === 'moderator' || role === 'admin')
  return (
    <>
      {ratings.map((rating) => (
        <ShownRatingCard key={rating.ratingId} rating={rating}>
          {isStaff ? <HideWords rating={rating} /> : null}
        </ShownRatingCard>
      ))}
      {query.isFetchNextPageError ? (
        <ErrorState level={3} title="We could not load older ratings" body="Nothing is lost. Try again." />
      ) : null}
      {query.hasNextPage ? (
        <Button
          label="Show older ratings"
          kind="secondary"
          isBusy={query.isFetchingNextPage}
          busyLabel="Loading"
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </>
  )
}

const styles = StyleSheet.create({ list: { gap: space.md } })
