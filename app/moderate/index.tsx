import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ReviewQueue = lazy(() =>
  import('@/components/moderation/moderation-group').then((group) => ({ default: group.ReviewQueue })),
)

export default function ModeratePage() {
  return (
    <Page
      title="Moderation"
      intro="Listings that wait for a decision, the riskiest first."
      back={{ label: 'Back to me', href: '/me' }}
    >
      <LazyPart label="Loading the queue">
        <ReviewQueue />
      </LazyPart>
    </Page>
  )
}
