import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { RadioGroup } from '@/components/ui/radio-group'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ShownListing } from '@/shared/contracts/listings'
import { printCents } from '@/shared/units/money'

import type { quoteReservation } from './reservation'

interface Props {
  listing: ShownListing
  quote: NonNullable<ReturnType<typeof quoteReservation>>
  mode: 'deposit' | 'full'
  mayFull: boolean
  onMode: (mode: 'deposit' | 'full') => void
}

function Line({ name, cents, isStrong }: { name: string; cents: number; isStrong?: boolean }) {
  return (
    <View style={styles.line}>
      <Text style={styles.name}>{name}</Text>
      <Text face={isStrong ? 'strong' : 'body'} isFigures>
        {printCents(cents)}
      </Text>
    </View>
  )
}

/** Every cent and what it is for, before anything is taken. */
export function PaySummary({ listing, quote, mode, mayFull, onMode }: Props) {
  const { accept, balanceDue, freeCancelHours, depositPct } = listing.body
  const now = mode === 'full' ? quote.totalCents : quote.depositCents
  const later = quote.totalCents - now
  const unitCents = Math.round(quote.goodsCents / quote.quantity)
  return (
    <Card labelledBy="pay-summary">
      <Heading level={2} size="lead" nativeID="pay-summary">
        What you pay
      </Heading>
      <Line name={`${quote.quantity} × ${printCents(unitCents)}`} cents={quote.goodsCents} />
      <Line name="Total" cents={quote.totalCents} isStrong />
      {mayFull ? (
        <RadioGroup
          label="Pay now"
          value={mode}
          onChange={onMode}
          choices={[
            {
              value: 'deposit',
              label: `The deposit, ${printCents(quote.depositCents)}`,
              hint: `${depositPct} % of the animals`,
            },
            {
              value: 'full',
              label: `Everything, ${printCents(quote.totalCents)}`,
              hint: 'One payment, nothing at the gate',
            },
          ]}
        />
      ) : null}
      <Line
        name={accept === 'ask' ? 'Earmarked now, taken when the seller accepts' : 'Paid now'}
        cents={now}
        isStrong
      />
      {later > 0 ? (
        <Line
          name={
            balanceDue === 'before'
              ? 'Balance, due 48 hours before'
              : 'Balance, paid on your phone at the gate'
          }
          cents={later}
        />
      ) : null}
      <Text size="note" tint="muted">
        {`Free to cancel until ${freeCancelHours} hours before the pickup time; after that the seller may keep up to the deposit of ${printCents(quote.depositCents)}. If the seller cancels you get every cent back.`}
      </Text>
      <Text size="note" tint="muted">
        Your money is held by our payment processor until you confirm, or until the claim window ends.
      </Text>
    </Card>
  )
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space.md },
  name: { flex: 1 },
})
