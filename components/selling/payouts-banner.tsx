import { View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { Text } from '@/components/ui/text'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** Stands there until the seller can be paid. */
export function PayoutsBanner({ payouts }: { payouts: OwnSeller['payouts'] }) {
  if (payouts === 'ready') return null
  const isBegun = payouts === 'unfinished'
  return (
    <Banner tone="caution" title={isBegun ? 'Payouts are not finished' : 'Payouts are not set up yet'}>
      <Text size="note">You can write listings now. They can be published once you can be paid.</Text>
      <View>
        <ButtonLink
          kind="secondary"
          href="/sell/payouts"
          label={isBegun ? 'Finish payouts' : 'Set up payouts'}
        />
      </View>
    </Banner>
  )
}
