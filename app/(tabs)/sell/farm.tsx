import { Redirect, useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const FarmScreen = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.FarmScreen })),
)

export default function FarmPage() {
  // The payment processor sends people back to this address.
  const { payouts } = useLocalSearchParams<{ payouts?: string }>()
  if (payouts) return <Redirect href="/sell/payouts" />
  return (
    <Page
      title="Your farm"
      width="readable"
      intro="Once, in about three minutes. Everything can be changed later."
      back={{ label: 'Back to selling', href: '/sell' }}
    >
      <LazyPart label="Loading the form">
        <FarmScreen />
      </LazyPart>
    </Page>
  )
}
