import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SeasonPage = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.SeasonPage })),
)

export default function SeasonRoute() {
  return (
    <Page
      title="When they can be shipped"
      intro="Fish die of cold nights and hot vans. Here is the year between two places, week by week."
      width="readable"
      back={{ label: 'Back to the calculators', href: '/tools' }}
    >
      <LazyPart label="Loading the season">
        <SeasonPage />
      </LazyPart>
    </Page>
  )
}
