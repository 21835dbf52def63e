import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { ChooseShipDay } from './choose-ship-day'
import { OtherWindow } from './other-window'
import { proposedWords, silenceWords, startedWords } from './hold-words'

import { ActFailed } from '@/components/orders/act-failed'
import { zoneOf } from '@/components/orders/order-zone'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Confirm } from '@/components/ui/confirm'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useFilledAct, usePressedAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { ShownHold } from '@/shared/contracts/shipments'

/** Why weather stopped the day, which one is proposed, what silence does, and the buyer's three answers. */
export function WeatherHold({ order }: { order: ShownOrder }) {
  const { hold, state, clock, party } = order
  if (!hold || state !== 'weather_hold') return null
  const zone = zoneOf(order)
  const proposed = proposedWords(hold, zone)
  const isBuyer = party === 'buyer'
  return (
    <View style={styles.frame}>
      <Banner tone="caution" title="On hold for weather">
        <Text>{hold.why}</Text>
        <Text size="note" tint="muted">
          {startedWords(hold, party === 'seller')}
        </Text>
        <Text face="strong">{proposed ? `Proposed: ${proposed}.` : 'No new day is proposed yet.'}</Text>
        <Text>
          {silenceWords({ silenceMoves: hold.silenceMoves, until: clock?.at ?? null, zone, isBuyer })}
        </Text>
      </Banner>
      {isBuyer ? <Answers order={order} hold={hold} proposed={proposed} /> : null}
    </View>
  )
}

interface AnswersProps {
  order: ShownOrder
  hold: ShownHold
  proposed: string | null
}

function Answers({ order, hold, proposed }: AnswersProps) {
  const [open, setOpen] = useState<'other' | 'end' | null>(null)
  const agree = useFilledAct('agreeNewDay', order.orderId)
  const end = usePressedAct(order.orderId)
  const may = new Set(order.may)
  const close = () => setOpen(null)
  return (
    <>
      <ActFailed error={agree.error ?? end.error} />
      {may.has('agree-new-day') && hold.proposed ? (
        <Button
          label="Agree to the new day"
          icon="check"
          isWide
          isBusy={agree.isPending}
          busyLabel="Agreeing"
          onPress={() => agree.mutate({})}
        />
      ) : null}
      {may.has('agree-new-day') ? (
        <Button
          label={proposed ? 'Choose another day' : 'Choose a day'}
          kind="secondary"
          isWide
          onPress={() => setOpen('other')}
        />
      ) : null}
      {may.has('decline-new-day') ? (
        <Button label="End it for a full refund" kind="quiet" isWide onPress={() => setOpen('end')} />
      ) : null}
      {open === 'other' && order.handOver === 'ship' ? (
        <ChooseShipDay order={order} act="agreeNewDay" onClose={close} />
      ) : null}
      {open === 'other' && order.handOver === 'pickup' ? <OtherWindow order={order} onClose={close} /> : null}
      <Confirm
        title="End the order?"
        isOpen={open === 'end'}
        actLabel="End it, refund everything"
        keepLabel="Keep the order"
        isDanger
        isBusy={end.isPending}
        busyLabel="Ending it"
        onAct={() => end.mutate('declineNewDay', { onSettled: close })}
        onClose={close}
      >
        Every cent you paid goes back. The animals go back on sale.
      </Confirm>
    </>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.md } })
