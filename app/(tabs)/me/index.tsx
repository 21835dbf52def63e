import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const MemberHome = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.MemberHome })),
)

export default function MePage() {
  return (
    <Page title="Me" width="readable">
      <LazyPart label="Loading your account">
        <MemberHome />
      </LazyPart>
    </Page>
  )
}
