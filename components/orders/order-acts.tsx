import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { DeclineOrder } from '@/components/orders/decline-order'
import { HandOverForm } from '@/components/orders/hand-over-form'
import { goToPayment } from '@/components/orders/go-to-payment'
import { OrderTrouble } from '@/components/orders/order-trouble'
import { ShippingActs } from '@/components/shipping/shipping-acts'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Confirm } from '@/components/ui/confirm'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useOrderAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printCents } from '@/shared/units/money'

/** The acts the server says are open, each a button in words. Rules live there, not here. */
export function OrderActs({ order }: { order: ShownOrder }) {
  const act = useOrderAct(order.orderId)
  const [asking, setAsking] = useState<'leave' | 'withdraw' | 'good' | null>(null)
  const [isDeclining, setDeclining] = useState(false)
  const may = new Set(order.may)
  const running = act.isPending ? act.variables : null

  const pay = (name: 'payDeposit' | 'payBalance') =>
    act.mutate(name, { onSuccess: (fresh) => fresh.payUrl && goToPayment(fresh.payUrl) })
  const confirmed = (name: 'leaveReservation' | 'withdrawRequest' | 'confirmGood') =>
    act.mutate(name, { onSettled: () => setAsking(null) })
  const { firstChargeCents, balanceCents } = order.money

  return (
    <View style={styles.acts}>
      {act.error ? (
        <Banner tone="danger" title="That did not work" isLive>
          <Text>{act.error.message}</Text>
        </Banner>
      ) : null}
      {may.has('pay-deposit') ? (
        <Button
          label={`Pay ${printCents(firstChargeCents)} now`}
          icon="money"
          isWide
          isBusy={running === 'payDeposit'}
          busyLabel="Opening the payment page"
          onPress={() => pay('payDeposit')}
        />
      ) : null}
      {may.has('accept') ? (
        <Button
          label={`Accept: sell ${order.quantity}`}
          icon="check"
          isWide
          isBusy={running === 'acceptOrder'}
          busyLabel="Taking the deposit"
          onPress={() => act.mutate('acceptOrder')}
        />
      ) : null}
      {may.has('mark-ready') ? (
        <Button
          label={order.handOver === 'ship' ? 'Mark ready to send' : 'Mark ready to collect'}
          icon="check"
          isWide
          isBusy={running === 'markReady'}
          onPress={() => act.mutate('markReady')}
        />
      ) : null}
      <ShippingActs order={order} />
      {may.has('pay-balance') ? (
        <Button
          label={`Pay the balance, ${printCents(balanceCents)}`}
          icon="money"
          isWide
          isBusy={running === 'payBalance'}
          busyLabel="Opening the payment page"
          onPress={() => pay('payBalance')}
        />
      ) : null}
      {may.has('hand-over') ? <HandOverForm order={order} /> : null}
      {may.has('confirm-good') ? (
        <Button label="All good: release the money" icon="check" isWide onPress={() => setAsking('good')} />
      ) : null}
      {may.has('decline') ? (
        <Button label="Decline" kind="secondary" isWide onPress={() => setDeclining(true)} />
      ) : null}
      {may.has('leave') ? (
        <Button label="Let the animals go" kind="quiet" isWide onPress={() => setAsking('leave')} />
      ) : null}
      {may.has('withdraw') ? (
        <Button label="Take the request back" kind="quiet" isWide onPress={() => setAsking('withdraw')} />
      ) : null}
      <OrderTrouble order={order} />
      <DeclineOrder order={order} isOpen={isDeclining} onClose={() => setDeclining(false)} />
      <Confirm
        title="Let the animals go?"
        isOpen={asking === 'leave'}
        actLabel="Let them go"
        keepLabel="Keep the hold"
        isBusy={running === 'leaveReservation'}
        onAct={() => confirmed('leaveReservation')}
        onClose={() => setAsking(null)}
      >
        <Text>{`The ${order.quantity} animals are free for others at once. Nothing was charged.`}</Text>
      </Confirm>
      <Confirm
        title="Take the request back?"
        isOpen={asking === 'withdraw'}
        actLabel="Take it back"
        keepLabel="Keep waiting"
        isBusy={running === 'withdrawRequest'}
        onAct={() => confirmed('withdrawRequest')}
        onClose={() => setAsking(null)}
      >
        <Text>{`Nothing was taken: the ${printCents(firstChargeCents)} earmarked on your card are let go.`}</Text>
      </Confirm>
      <Confirm
        title="Release the money?"
        isOpen={asking === 'good'}
        actLabel="All good, release it"
        keepLabel="Not yet"
        isBusy={running === 'confirmGood'}
        onAct={() => confirmed('confirmGood')}
        onClose={() => setAsking(null)}
      >
        <Text>
          Only if the animals are alive and as described. After this the seller is paid and a loss can no
          longer be reported.
        </Text>
      </Confirm>
    </View>
  )
}

const styles = StyleSheet.create({ acts: { gap: space.md } })
