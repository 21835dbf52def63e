import { NoticeList } from './notice-list'

import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useMe } from '@/hooks/use-me'

/** The member's notices, or the way to sign in. */
export function NoticesHome() {
  const { me, isPending } = useMe()
  if (isPending) return <SkeletonRows label="Loading your notices" rows={4} />
  if (me) return <NoticeList />
  return (
    <EmptyState
      title="Sign in to see your notices"
      body="What happens to your orders and your listings stands there, newest first."
      action={<ButtonLink label="Sign in" href="/sign-in?returnTo=/notices" />}
    />
  )
}
