import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ResetForm = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.ResetForm })),
)

export default function ResetPassword() {
  const { token } = useLocalSearchParams<{ token?: string }>()
  return (
    <Page
      title="Choose a new password"
      width="readable"
      back={{ label: 'Back to sign in', href: '/sign-in' }}
    >
      <LazyPart label="Loading the form">
        <ResetForm token={token} />
      </LazyPart>
    </Page>
  )
}
