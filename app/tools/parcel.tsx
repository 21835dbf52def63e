import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ParcelPage = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.ParcelPage })),
)

export default function ParcelRoute() {
  return (
    <Page
      title="A parcel: will they survive, and how to pack"
      intro="Oxygen, carbon dioxide, ammonia and warmth in the bag, hour by hour, and the cheapest box that keeps them safe."
      width="readable"
      back={{ label: 'Back to the calculators', href: '/tools' }}
    >
      <LazyPart label="Loading the trip check">
        <ParcelPage />
      </LazyPart>
    </Page>
  )
}
