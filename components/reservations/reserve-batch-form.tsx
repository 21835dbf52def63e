import { CollectChoice } from './collect-choice'
import { GateStatements } from './gate-statements'
import { PaySummary } from './pay-summary'
import type { Way } from './reservation'
import { ReserveProblem } from './reserve-problem'
import { ShipChoice } from './ship-choice'
import { useReservation } from './use-reservation'

import { countedNoun } from '@/components/listings/counted-words'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import type { ShownListing } from '@/shared/contracts/listings'
import { printCents } from '@/shared/units/money'

interface Props {
  listing: ShownListing
  count: string | undefined
  wantedWay: Way
}

const ways = [
  { value: 'collect', label: 'Collect them', hint: 'You count together at the gate.' },
  { value: 'ship', label: 'Have them shipped', hint: 'In a box, on a day on which they arrive well.' },
] as const

export function ReserveBatchForm(props: Props) {
  const form = useReservation(props)
  const { listing, quote, way } = form
  return (
    <>
      <ErrorSummary errors={form.shown} attempt={form.attempt} />
      <Card>
        <NumberField
          label="How many"
          fieldId="quantity"
          value={form.quantityText}
          onChangeText={form.setQuantity}
          suffix={countedNoun(listing.body, 2) || undefined}
          hint={`From ${listing.body.minOrder}, in steps of ${listing.body.orderStep}; ${listing.free} left`}
          error={form.errorAt('quantity')}
        />
        {form.mayShip ? (
          <RadioGroup
            label="How do they come to you?"
            value={way}
            choices={ways}
            onChange={form.setWay}
            fieldId="way"
          />
        ) : null}
        {way === 'collect' ? <CollectChoice form={form} /> : null}
      </Card>
      {way === 'ship' ? <ShipChoice form={form} /> : null}
      {listing.gate ? (
        <GateStatements
          gate={listing.gate}
          ticked={form.ticked}
          onChange={form.setTicked}
          errorAt={form.errorAt}
        />
      ) : null}
      {quote ? (
        <PaySummary
          listing={listing}
          quote={quote}
          way={way}
          mode={form.mode}
          mayFull={form.mayFull}
          onMode={form.setPayMode}
        />
      ) : null}
      <ReserveProblem error={form.reserve.error} listingId={listing.listingId} />
      <Button
        label={
          quote
            ? `Hold ${quote.quantity} and pay ${printCents(form.mode === 'full' ? quote.totalCents : quote.depositCents)}`
            : 'Hold them'
        }
        icon="check"
        isWide
        isBusy={form.reserve.isPending}
        busyLabel="Holding them for you"
        onPress={form.send}
      />
    </>
  )
}
