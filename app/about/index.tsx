import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const AboutText = lazy(() =>
  import('@/components/account/account-group').then((group) => ({ default: group.AboutText })),
)

export default function About() {
  return (
    <Page title="About Tankward" width="readable" back={{ label: 'Back to find', href: '/' }}>
      <LazyPart label="Loading the text">
        <AboutText />
      </LazyPart>
    </Page>
  )
}
