import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const AskResetForm = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.AskResetForm })),
)

export default function ForgotPassword() {
  return (
    <Page
      title="A new password"
      intro="Give the address of your account and we send a link to choose a new one."
      width="readable"
      back={{ label: 'Back to sign in', href: '/sign-in' }}
    >
      <LazyPart label="Loading the form">
        <AskResetForm />
      </LazyPart>
    </Page>
  )
}
