import { StyleSheet, View } from 'react-native'

import { DeskFault } from './desk-fault'
import { QueueTable } from './queue-table'
import { QueueTag } from './queue-tag'

import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useReviewQueue } from '@/hooks/use-moderation'

interface Props {
  nowMs: number
  onKeys: () => void
}

/** What waits for a decision, the riskiest first. */
export function ReviewQueue({ nowMs, onKeys }: Props) {
  const query = useReviewQueue()
  const isPhone = useBreakpoint() === 'phone'
  if (query.isPending) return <TagSkeleton label="Loading the queue" count={4} />
  if (!query.data) {
    return (
      <DeskFault error={query.error} onRetry={() => void query.refetch()} isRetrying={query.isRefetching} />
    )
  }
  const rows = query.data.pages.flatMap((page) => page.items)
  if (rows.length === 0) {
    return (
      <EmptyState
        icon="check"
        title="Nothing waits"
        body="New listings and changes appear here by themselves."
      />
    )
  }
  return (
    <View style={styles.frame}>
      {isPhone ? (
        <View role="list" aria-label="Listings that wait" style={styles.list}>
          {rows.map((row) => (
            <QueueTag key={row.versionId} row={row} nowMs={nowMs} />
          ))}
        </View>
      ) : (
        <>
          <QueueTable rows={rows} nowMs={nowMs} />
          <View style={styles.foot}>
            <Text size="small" tint="muted">
              j and k move through both lists, Enter opens.
            </Text>
            <Button kind="quiet" label="All keys (?)" onPress={onKeys} />
          </View>
        </>
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
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  list: { gap: space.md },
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between' },
})
