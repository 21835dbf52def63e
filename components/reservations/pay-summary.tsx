import { StyleSheet, View } from 'react-native'

import { quoteCount, type Quote, type Way } from './reservation'

import { countedWords } from '@/components/listings/counted-words'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { RadioGroup } from '@/components/ui/radio-group'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ShownListing } from '@/shared/contracts/listings'
import { printCents } from '@/shared/units/money'

interface Props {
  listing: ShownListing
  quote: Quote
  way: Way
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

/** "2 boxes", "1 box". */
const boxesWords = (boxes: number) => (boxes === 1 ? '1 box' : `${boxes} boxes`)

/** Box and freight, and what one animal comes to at the door beside the gate. */
function ShippedLines({ listing, quote }: Pick<Props, 'listing' | 'quote'>) {
  const { boxes, boxCents, freightCents, totalCents, landedCents, quantity } = quote
  return (
    <>
      <Line name={`Packing, ${boxesWords(boxes)}`} cents={boxCents} />
      <Line name={`Freight, ${boxesWords(boxes)}`} cents={freightCents} />
      <Line name="Total" cents={totalCents} isStrong />
      <View style={styles.each}>
        <Line name="Each animal at your end, all in" cents={landedCents} isStrong />
        <Line name="Each if you collect them" cents={quoteCount(listing, quantity, 'collect').landedCents} />
      </View>
    </>
  )
}

/** Every cent and what it is for, before anything is taken. */
export function PaySummary({ listing, quote, way, mode, mayFull, onMode }: Props) {
  const { accept, balanceDue, freeCancelHours, depositPct } = listing.body
  const isShipped = way === 'ship'
  const now = mode === 'full' ? quote.totalCents : quote.depositCents
  const later = quote.totalCents - now
  return (
    <Card labelledBy="pay-summary">
      <Heading level={2} size="lead" nativeID="pay-summary">
        What you pay
      </Heading>
      <Line
        name={`${countedWords(listing.body, quote.quantity)} × ${printCents(quote.unitCents)}`}
        cents={quote.goodsCents}
      />
      {isShipped ? (
        <ShippedLines listing={listing} quote={quote} />
      ) : (
        <Line name="Total" cents={quote.totalCents} isStrong />
      )}
      {mayFull ? (
        <RadioGroup
          label="Pay now"
          value={mode}
          onChange={onMode}
          choices={[
            {
              value: 'deposit',
              label: `The deposit, ${printCents(quote.depositCents)}`,
              hint: `${depositPct} % of the price`,
            },
            {
              value: 'full',
              label: `Everything, ${printCents(quote.totalCents)}`,
              hint: isShipped ? 'One payment, nothing more to do' : 'One payment, nothing at the gate',
            },
          ]}
        />
      ) : null}
      <Line
        name={accept === 'ask' ? 'Earmarked now, taken when the seller accepts' : 'Paid now'}
        cents={now}
        isStrong
      />
      {later > 0 ? <Line name={balanceWords(isShipped, balanceDue)} cents={later} /> : null}
      <Text size="note" tint="muted">
        {`Free to cancel until ${freeCancelHours} hours before the ${isShipped ? 'ship day' : 'pickup time'}; after that the seller may keep up to the deposit of ${printCents(quote.depositCents)}. ${isShipped ? 'If the seller cancels, or the weather stops the day and you do not want another, you get every cent back.' : 'If the seller cancels you get every cent back.'}`}
      </Text>
      <Text size="note" tint="muted">
        Your money is held by our payment processor until you confirm, or until the claim window ends.
      </Text>
    </Card>
  )
}

function balanceWords(isShipped: boolean, balanceDue: ShownListing['body']['balanceDue']): string {
  if (isShipped) return 'Balance, due 48 hours before the ship day'
  return balanceDue === 'before' ? 'Balance, due 48 hours before' : 'Balance, paid on your phone at the gate'
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space.md },
  name: { flex: 1 },
  each: { gap: space.xs },
})
