import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const NoShipDays = lazy(() =>
  import('@/components/moderation/moderation-group').then((group) => ({ default: group.NoShipDays })),
)

export default function ShipDaysPage() {
  return (
    <Page
      title="Days without carriers"
      intro="No box leaves, travels or arrives on these days. Federal holidays come by themselves."
      back={{ label: 'Moderation', href: '/moderate' }}
      width="readable"
    >
      <LazyPart label="Loading the days">
        <NoShipDays />
      </LazyPart>
    </Page>
  )
}
