import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { safeReturn } from '@/components/account/safe-return'
import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SignUpForm = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.SignUpForm })),
)

export default function SignUp() {
  const { returnTo } = useLocalSearchParams<{ returnTo?: string }>()
  return (
    <Page title="Make an account" width="readable" back={{ label: 'Back', href: '/' }}>
      <LazyPart label="Loading the form">
        <SignUpForm returnTo={safeReturn(returnTo)} />
      </LazyPart>
    </Page>
  )
}
