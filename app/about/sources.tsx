import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const AboutSources = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.AboutSources })),
)

export default function SourcesPage() {
  return (
    <Page title="Sources" width="readable" back={{ label: 'Back to about Tankward', href: '/about' }}>
      <LazyPart label="Loading the sources">
        <AboutSources />
      </LazyPart>
    </Page>
  )
}
