import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { safeReturn } from '@/components/account/safe-return'
import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const EmailLanding = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.EmailLanding })),
)

export default function VerifyEmail() {
  const { error, returnTo } = useLocalSearchParams<{ error?: string; returnTo?: string }>()
  return (
    <Page title="Your e-mail address" width="readable" back={{ label: 'Back to find', href: '/' }}>
      <LazyPart label="Loading">
        <EmailLanding fault={error} returnTo={safeReturn(returnTo)} />
      </LazyPart>
    </Page>
  )
}
