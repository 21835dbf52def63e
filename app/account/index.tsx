import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const AccountHome = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.AccountHome })),
)

export default function AccountPage() {
  return (
    <Page title="Account" width="readable" back={{ label: 'Back to Me', href: '/me' }}>
      <LazyPart label="Loading your account">
        <AccountHome />
      </LazyPart>
    </Page>
  )
}
