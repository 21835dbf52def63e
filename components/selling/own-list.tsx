import { StyleSheet, View } from 'react-native'

import { AgainAct } from './again-act'
import { isAnswerDue } from './own-state-words'
import { ownFacts } from './own-facts'
import { ReviewOutcome } from './review-outcome'

import { Tag } from '@/components/listings/tag'
import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { space } from '@/constants/theme'
import { useOwnListings } from '@/hooks/use-own-listings'
import { useUnits } from '@/hooks/use-units'
import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** The seller's listings as tags: those a moderator asks about first, then the newest change. */
export function OwnList({ farm }: { farm: OwnSeller }) {
  const query = useOwnListings(true)
  if (query.isPending) return <TagSkeleton label="Loading your listings" count={3} />
  if (!query.data) {
    return (
      <ErrorState
        title="We could not load your listings"
        body={query.error.message}
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const listings = query.data.pages.flatMap((page) => page.items)
  if (listings.length === 0) {
    return (
      <EmptyState
        title="Nothing listed yet"
        body="Greens take about two minutes, a batch of fish about five: have the count and a photo at hand."
      />
    )
  }
  const ordered = [...listings.filter(isAnswerDue), ...listings.filter((own) => !isAnswerDue(own))]
  return (
    <View style={styles.frame}>
      <View role="list" aria-label="Your listings" style={styles.list}>
        {ordered.map((own) => (
          <OwnTag key={own.listingId} own={own} farm={farm} />
        ))}
      </View>
      {query.hasNextPage ? (
        <Button
          kind="secondary"
          label="Show older listings"
          busyLabel="Loading"
          isBusy={query.isFetchingNextPage}
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </View>
  )
}

function OwnTag({ own, farm }: { own: OwnListing; farm: OwnSeller }) {
  const units = useUnits()
  return (
    <View role="listitem" style={styles.one}>
      <Tag size="row" facts={ownFacts(own, units)} />
      <ReviewOutcome own={own} />
      <AgainAct own={own} farm={farm} />
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  list: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg },
  one: { flexGrow: 1, flexBasis: 420, minWidth: 0, maxWidth: '100%', gap: space.sm },
})
