import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ModerationHome = lazy(() =>
  import('@/components/moderation/moderation-group').then((group) => ({ default: group.ModerationHome })),
)

export default function ModeratePage() {
  return (
    <Page
      title="Moderation"
      intro="Listings that wait for a decision, the riskiest first, then what members report."
      back={{ label: 'Back to me', href: '/me' }}
    >
      <LazyPart label="Loading the queue">
        <ModerationHome />
      </LazyPart>
    </Page>
  )
}
