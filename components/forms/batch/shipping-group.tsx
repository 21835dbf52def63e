import { useFormContext, useWatch } from 'react-hook-form'

import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundChips } from '@/components/forms/bound/bound-chips'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { shipDayNames } from '@/components/listings/shipping-words'
import { packingWords } from '@/components/trips/packing-words'
import { Text } from '@/components/ui/text'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import { packingClassIds } from '@/shared/domain/season/season-lane'
import { shipDays } from '@/shared/domain/shipping/ship-days'

import { CarrierFields } from './carrier-fields'
import { SeasonNote } from './season-note'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

const packings = packingClassIds.map((id) => ({ value: id, label: packingWords[id] }))
const days = shipDays.map((day) => ({ value: day, label: shipDayNames[day] }))

export function ShippingGroup({ farm }: { farm: OwnSeller }) {
  const form = useFormContext<BatchTyping>()
  const { isOffered, packing } = useWatch<BatchTyping, 'shipping'>({ name: 'shipping' })
  const isTwoDays = packing !== '' && packingClasses[packing].nights > 1
  return (
    <FormGroup
      groupId="shipping"
      title="Shipping (optional)"
      intro="Buyers in the states you serve can then have a box sent, on days on which the animals arrive well. You get the packing of each box, and labels."
    >
      <BoundCheck<BatchTyping>
        name="shipping.isOffered"
        label="This batch can be shipped"
        hint="To the states you named under Legal, in the weeks in which it usually arrives alive."
        onChosen={() => form.clearErrors('shipping')}
      />
      {isOffered ? (
        <>
          <BoundChoice<BatchTyping>
            name="shipping.packing"
            label="Packed in"
            hint="Box and time on the way decide in which weeks it is safe."
            choices={packings}
            isFolded
            emptyLabel="Choose a packing"
          />
          <SeasonNote farm={farm} />
          <FieldRow>
            <FieldCell>
              <BoundText<BatchTyping>
                name="shipping.boxCents"
                label="Charge for a box"
                hint="Box, packs and packing, without freight; 0 is an answer."
                placeholder="12.00"
                prefix="$"
                isFigure
              />
            </FieldCell>
            <FieldCell>
              <BoundText<BatchTyping>
                name="shipping.mostInBox"
                label="Most fish in a box"
                placeholder="100"
                isFigure
              />
            </FieldCell>
          </FieldRow>
          <CarrierFields />
          <BoundChips<BatchTyping>
            name="shipping.days"
            label="Ships on"
            choices={isTwoDays ? days.filter(({ value }) => value !== 'wed') : days}
          >
            <Text size="note" tint="muted">
              {isTwoDays
                ? 'Monday or Tuesday, so that a box two days on the way never waits over a weekend.'
                : 'Monday to Wednesday, so that a late box still arrives before the weekend.'}
            </Text>
          </BoundChips>
        </>
      ) : null}
    </FormGroup>
  )
}
