import { StyleSheet, View } from 'react-native'

import type { ReportAct } from './report-sheet'
import { ReportedTable } from './reported-table'
import { ReportedTag } from './reported-tag'

import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useReportedListings } from '@/hooks/use-reported-listings'
import { Problem } from '@/shared/api/problem'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

export interface ReportedActs {
  nowMs: number
  /** Which row the keyboard is on, so that single keys know what they decide; null when it has left. */
  onRow: (listing: ReportedListing | null) => void
  onDecide: (act: ReportAct, listing: ReportedListing) => void
}

// The queue above has said so already.
const refused = ['not-signed-in', 'not-allowed', 'second-factor-needed']

/** What members report: one row a listing, the longest waiting first. */
export function ReportedList(acts: ReportedActs) {
  const query = useReportedListings()
  if (query.error instanceof Problem && refused.includes(query.error.slug)) return null
  return (
    <View style={styles.frame}>
      <Heading level={2} size="lead">
        Reported listings
      </Heading>
      <Rows query={query} acts={acts} />
    </View>
  )
}

function Rows({ query, acts }: { query: ReturnType<typeof useReportedListings>; acts: ReportedActs }) {
  const isPhone = useBreakpoint() === 'phone'
  if (query.isPending) return <TagSkeleton label="Loading what is reported" count={2} />
  if (!query.data) {
    return (
      <ErrorState
        level={3}
        title="The reports did not load"
        body={query.error.message}
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const rows = query.data.pages.flatMap((page) => page.items)
  if (rows.length === 0) {
    return (
      <EmptyState
        level={3}
        icon="check"
        title="Nothing is reported"
        body="What members report appears here by itself."
      />
    )
  }
  return (
    <>
      {isPhone ? (
        <View role="list" aria-label="Reported listings" style={styles.list}>
          {rows.map((row) => (
            <ReportedTag key={row.listingId} row={row} acts={acts} />
          ))}
        </View>
      ) : (
        <ReportedTable rows={rows} acts={acts} />
      )}
      {query.hasNextPage ? (
        <Button
          kind="secondary"
          label="Show more"
          busyLabel="Loading"
          isBusy={query.isFetchingNextPage}
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.md }, list: { gap: space.md } })
