import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { safeReturn } from '@/components/account/safe-return'
import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SignInForm = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.SignInForm })),
)

export default function SignIn() {
  const { returnTo } = useLocalSearchParams<{ returnTo?: string }>()
  return (
    <Page title="Sign in" width="readable" back={{ label: 'Back', href: '/' }}>
      <LazyPart label="Loading the form">
        <SignInForm returnTo={safeReturn(returnTo)} />
      </LazyPart>
    </Page>
  )
}
