import { StyleSheet, View } from 'react-native'

import { NoticeRow } from './notice-row'

import { NoConnection } from '@/components/listings/no-connection'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'
import { useNotices, useReadAllNotices } from '@/hooks/use-notices'
import { useOnline } from '@/hooks/use-online'
import { useUnread } from '@/hooks/use-unread'

export function NoticeList() {
  const query = useNotices()
  const unread = useUnread()
  const readAll = useReadAllNotices()
  const isOnline = useOnline()
  const toast = useToast()
  if (!query.data) {
    if (!isOnline) return <NoConnection kept="Nothing is lost." onRetry={() => void query.refetch()} />
    if (!query.error) return <SkeletonRows label="Loading your notices" rows={4} />
    return (
      <ErrorState
        title="We could not load your notices"
        body="Nothing is lost: your orders and mails are as they were. Try again in a moment."
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const notices = query.data.pages.flatMap((page) => page.items)
  if (notices.length === 0) {
    return (
      <EmptyState
        title="No notices yet"
        body="When something happens to an order or a listing of yours, it stands here."
        action={<ButtonLink label="Find fish near you" href="/" />}
      />
    )
  }
  const { timeZone } = new Intl.DateTimeFormat().resolvedOptions()
  return (
    <View style={styles.list}>
      {unread ? (
        <Button
          label="Mark all read"
          kind="secondary"
          isBusy={readAll.isPending}
          onPress={() =>
            readAll.mutate(undefined, { onError: ({ message }) => toast({ text: message, tone: 'danger' }) })
          }
        />
      ) : null}
      <View role="list" aria-label="Notices" style={styles.list}>
        {notices.map((notice) => (
          <View role="listitem" key={notice.noticeId}>
            <NoticeRow notice={notice} zone={timeZone} />
          </View>
        ))}
      </View>
      {query.hasNextPage ? (
        <Button
          label="Show older notices"
          kind="secondary"
          isBusy={query.isFetchingNextPage}
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: space.md } })
