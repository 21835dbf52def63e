import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SecondFactorSettings = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.SecondFactorSettings })),
)

export default function SecondFactorPage() {
  return (
    <Page title="Second factor" width="readable" back={{ label: 'Back to Me', href: '/me' }}>
      <LazyPart label="Loading">
        <SecondFactorSettings />
      </LazyPart>
    </Page>
  )
}
