import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const NoticesHome = lazy(() =>
  import('@/components/notices/notices-group').then((group) => ({ default: group.NoticesHome })),
)

export default function NoticesPage() {
  return (
    <Page title="Notices" width="readable" back={{ label: 'Me', href: '/me' }}>
      <LazyPart label="Loading your notices">
        <NoticesHome />
      </LazyPart>
    </Page>
  )
}
