import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow } from '@/components/forms/form-group'
import { Text } from '@/components/ui/text'
import { fillCaution } from '@/shared/domain/rules/fill-caution'

import type { BatchTyping } from './batch-typing'

/** Who carries the box, for how much, and what the carrier has said. */
export function CarrierFields() {
  return (
    <>
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="shipping.carrier"
            label="Carrier and service"
            hint="In your own words; buyers read it."
            placeholder="overnight, by air"
            maxLength={60}
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping>
            name="shipping.freightCents"
            label="Freight for a box"
            hint="What the carrier takes, to any state you serve; 0 if it is in your price."
            placeholder="38.00"
            prefix="$"
            isFigure
          />
        </FieldCell>
      </FieldRow>
      <BoundCheck<BatchTyping>
        name="shipping.carrierAccepts"
        label="My carrier accepts these animals in this service"
        hint="Carriers differ and change their rules. Ask yours, and ask again when something changes."
      />
      <BoundCheck<BatchTyping>
        name="shipping.holdsAtCounter"
        label="My carrier can hold a box at its counter"
        hint="Then buyers may collect it there, indoors, instead of finding it on a porch."
      />
      <Text size="note" tint="muted">
        {fillCaution('G-14', {})}
      </Text>
    </>
  )
}
