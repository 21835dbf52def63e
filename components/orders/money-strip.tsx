import { StyleSheet, View } from 'react-native'

import { Heading } from '@/components/ui/heading'
import { Swatch } from '@/components/ui/swatch'
import { Text } from '@/components/ui/text'
import { color, radius, space, type ColorName } from '@/constants/theme'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printCents } from '@/shared/units/money'

interface Part {
  name: string
  cents: number
  fill: ColorName
}

/** The order's real cents, each in exactly one part: nothing is shown twice and the parts add up to the total. */
function partsOf({ money, state, balancePaid, party }: ShownOrder): Part[] {
  const { strip, totalCents } = money
  const isOver = state === 'cancelled'
  const toPay = isOver || balancePaid ? 0 : money.balanceCents
  const earmarked =
    state === 'reserved' || state === 'requested'
      ? Math.max(0, totalCents - toPay - strip.heldCents - strip.releasedCents - strip.refundedCents)
      : 0
  const fee = Math.max(
    0,
    isOver ? 0 : totalCents - toPay - earmarked - strip.heldCents - strip.releasedCents - strip.refundedCents,
  )
  const parts: Part[] = [
    { name: state === 'reserved' ? 'To pay now' : 'Earmarked on the card', cents: earmarked, fill: 'edge' },
    {
      name: `Held until ${party === 'buyer' ? 'you confirm' : 'the buyer confirms'}`,
      cents: strip.heldCents,
      fill: 'netting',
    },
    { name: 'Balance still to pay', cents: toPay, fill: 'line' },
    { name: 'Released to the seller', cents: strip.releasedCents, fill: 'safe' },
    { name: 'Fee and tax', cents: fee, fill: 'muted' },
    { name: 'Refunded', cents: strip.refundedCents, fill: 'frost' },
  ]
  return parts.filter((part) => part.cents > 0)
}

/** Where the money is: a bar in the proportion of the cents, with every part in words beneath it. */
export function MoneyStrip({ order }: { order: ShownOrder }) {
  const parts = partsOf(order)
  return (
    <View style={styles.strip}>
      <Heading level={2} size="lead">
        Where the money is
      </Heading>
      <View style={styles.bar} aria-hidden>
        {parts.map((part) => (
          <View
            key={part.name}
            style={{ flexGrow: part.cents, backgroundColor: color[part.fill], minWidth: 4 }}
          />
        ))}
      </View>
      {parts.length === 0 ? <Text tint="muted">No money has moved.</Text> : null}
      {parts.map((part) => (
        <View key={part.name} style={styles.row}>
          <Swatch pattern="solid" tint={part.fill} />
          <Text style={styles.name}>{part.name}</Text>
          <Text face="strong" isFigures>
            {printCents(part.cents)}
          </Text>
        </View>
      ))}
      <View style={[styles.row, styles.total]}>
        <Text style={styles.name}>Total</Text>
        <Text face="strong" isFigures>
          {printCents(order.money.totalCents)}
        </Text>
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  strip: { gap: space.sm },
  bar: {
    flexDirection: 'row',
    height: 20,
    gap: 2,
    borderRadius: radius.tag,
    overflow: 'hidden',
    backgroundColor: color.sunk,
  },
  row: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
  name: { flex: 1 },
  total: { borderTopWidth: 1, borderTopColor: color.line, paddingTop: space.sm },
})
