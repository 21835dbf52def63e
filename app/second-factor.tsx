import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { safeReturn } from '@/components/account/safe-return'
import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SecondFactorForm = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.SecondFactorForm })),
)

export default function SecondFactor() {
  const { returnTo } = useLocalSearchParams<{ returnTo?: string }>()
  return (
    <Page title="Your second factor" width="readable" back={{ label: 'Back to sign in', href: '/sign-in' }}>
      <LazyPart label="Loading the form">
        <SecondFactorForm returnTo={safeReturn(returnTo)} />
      </LazyPart>
    </Page>
  )
}
