import { StyleSheet, View } from 'react-native'

import { SellerGate } from './seller-gate'

import { goToPayment } from '@/components/orders/go-to-payment'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { newRequestKey } from '@/hooks/request-key'
import { useOwnFarm, useStartPayouts } from '@/hooks/use-own-farm'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** Where the seller stands with the payment processor, and the way to its own page. */
export function Payouts() {
  return <SellerGate>{(farm) => <PayoutState farm={farm} />}</SellerGate>
}

function PayoutState({ farm }: { farm: OwnSeller }) {
  if (farm.payouts !== 'ready') return <PayoutSteps isBegun={farm.payouts === 'unfinished'} />
  return (
    <View style={styles.frame}>
      <Banner tone="safe" title="Payouts are ready" isLive>
        The processor pays you after each order is settled. You can publish now.
      </Banner>
      <View style={styles.acts}>
        <ButtonLink href="/sell/listings/new" icon="plus" label="List something" />
        <ButtonLink kind="secondary" href="/sell" label="To your listings" />
      </View>
    </View>
  )
}

function PayoutSteps({ isBegun }: { isBegun: boolean }) {
  const start = useStartPayouts()
  const farm = useOwnFarm(true)
  const go = () => start.mutate(newRequestKey(), { onSuccess: ({ url }) => goToPayment(url) })
  return (
    <View style={styles.frame}>
      {isBegun ? (
        <Banner tone="caution" title="The processor still needs something" isLive>
          Go on where you stopped. If you have just finished there, it may take a minute until we hear of it.
        </Banner>
      ) : null}
      {start.error ? (
        <Banner tone="danger" title="The payout page did not open" isLive>
          {start.error.message}
        </Banner>
      ) : null}
      <Card>
        <Text>
          Our payment processor pays you. On its own page it asks who you are and where the money goes: about
          five minutes, once. We never see your bank or tax numbers.
        </Text>
        <Text tint="muted" size="note">
          Deposits and balances are held by the processor until the buyer confirms, or the time for telling
          losses is over. Then your share is on its way.
        </Text>
        <View style={styles.acts}>
          <Button
            label={isBegun ? 'Go on at the processor' : 'Set up payouts'}
            busyLabel="Opening its page"
            isBusy={start.isPending || start.isSuccess}
            onPress={go}
          />
          {isBegun ? (
            <Button
              kind="secondary"
              label="Look again"
              busyLabel="Looking"
              isBusy={farm.isFetching}
              onPress={() => void farm.refetch()}
            />
          ) : null}
          <ButtonLink kind="quiet" href="/sell" label="Later" />
        </View>
      </Card>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
})
