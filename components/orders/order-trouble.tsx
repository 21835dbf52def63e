import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { CancelOrder } from '@/components/orders/cancel-order'
import { ChooseSlot } from '@/components/orders/choose-slot'
import { DecideBox } from '@/components/orders/decide-box'
import { zoneOf } from '@/components/orders/order-zone'
import { SayWhatHappened } from '@/components/orders/say-what-happened'
import { StaffActs } from '@/components/orders/staff-acts'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printMoment } from '@/shared/times/print-time'

type Open = 'cancel' | 'slot' | 'no-show' | 'contest' | null

/** When things do not go as planned: another day, an end, somebody who did not come. */
export function OrderTrouble({ order }: { order: ShownOrder }) {
  const [open, setOpen] = useState<Open>(null)
  const may = new Set(order.may)
  const close = () => setOpen(null)
  const zone = zoneOf(order)
  return (
    <View style={styles.trouble}>
      {order.noShow ? (
        <Banner
          tone="caution"
          title={
            order.noShow.by === 'seller'
              ? 'The seller says the buyer did not come'
              : 'The buyer says the seller was not there'
          }
        >
          <Text>
            {`Who sees it otherwise can say so until ${printMoment(order.noShow.contestUntil, zone)}; a moderator then decides.`}
          </Text>
        </Banner>
      ) : null}
      {may.has('contest') ? (
        <Button
          label="It was otherwise: say what happened"
          icon="warn"
          isWide
          onPress={() => setOpen('contest')}
        />
      ) : null}
      {may.has('choose-slot') ? (
        <Button
          label={order.state === 'deposit_paid' ? 'Agree on a day' : 'Move to another day'}
          kind="secondary"
          isWide
          onPress={() => setOpen('slot')}
        />
      ) : null}
      {may.has('report-no-show') ? (
        <Button
          label={order.party === 'seller' ? 'The buyer did not come' : 'The seller is not here'}
          kind="secondary"
          isWide
          onPress={() => setOpen('no-show')}
        />
      ) : null}
      {may.has('cancel') ? (
        <Button label="Cancel the order" kind="quiet" isWide onPress={() => setOpen('cancel')} />
      ) : null}
      {may.has('decide') && order.handOver === 'ship' ? <DecideBox order={order} /> : null}
      {may.has('stop') || (may.has('decide') && order.handOver === 'pickup') ? (
        <StaffActs order={order} />
      ) : null}
      {open === 'cancel' ? <CancelOrder order={order} onClose={close} /> : null}
      {open === 'slot' ? <ChooseSlot order={order} onClose={close} /> : null}
      {open === 'no-show' || open === 'contest' ? (
        <SayWhatHappened order={order} act={open} onClose={close} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ trouble: { gap: space.md } })
