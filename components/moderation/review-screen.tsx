import { DeskFault } from './desk-fault'
import { ReviewDesk } from './review-desk'

import { Page } from '@/components/layout/page'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useReview } from '@/hooks/use-moderation'

export function ReviewScreen({ versionId }: { versionId: string }) {
  const query = useReview(versionId)
  if (query.data) return <ReviewDesk review={query.data} onReload={() => void query.refetch()} />
  return (
    <Page title="Review" back={{ label: 'Back to the queue', href: '/moderate' }}>
      {query.error ? (
        <DeskFault error={query.error} onRetry={() => void query.refetch()} isRetrying={query.isRefetching} />
      ) : (
        <SkeletonRows label="Loading the listing" rows={6} />
      )}
    </Page>
  )
}
