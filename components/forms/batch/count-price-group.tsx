import { useFormContext } from 'react-hook-form'

import { checkAgain } from './check-again'
import { TiersEditor } from './tiers-editor'

import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { Text } from '@/components/ui/text'

import type { BatchTyping } from './batch-typing'

const countMethods = [
  { value: 'hand', label: 'By hand', hint: 'Every fish is counted.' },
  {
    value: 'sample-weight',
    label: 'By weighed samples',
    hint: 'Three samples or more; total weight divided by the mean.',
  },
  { value: 'displacement', label: 'By displacement', hint: 'By how much water they push up.' },
]

export function CountPriceGroup({ isOnSale }: { isOnSale: boolean }) {
  const form = useFormContext<BatchTyping>()
  // The first price covers the smallest order until the seller says otherwise.
  function followMinOrder() {
    checkAgain(form, ['mostPerBuyer', 'tiers.0.fromCount'])
    if (form.getFieldState('tiers.0.fromCount').isDirty || form.getValues('tiers').length === 0) return
    form.setValue('tiers.0.fromCount', form.getValues('minOrder'))
  }
  return (
    <FormGroup groupId="count-price" title="Count and price">
      {isOnSale ? (
        <Text size="note" tint="muted">
          This batch is on sale, so its count is kept in stock: correct it on the page of the batch.
        </Text>
      ) : (
        <BoundText<BatchTyping>
          name="countOnHand"
          label="How many are there to sell?"
          placeholder="2,000"
          suffix="fish"
          isFigure
          onLeave={() => checkAgain(form, ['minOrder'])}
        />
      )}
      <BoundChoice<BatchTyping> name="countMethod" label="How do you count?" choices={countMethods} />
      <BoundText<BatchTyping>
        name="overcountPct"
        label="Extra fish packed free"
        hint="Covers losses before any refund. 5 % is usual, 15 % the most."
        suffix="%"
        isFigure
      />
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="minOrder"
            label="Smallest order"
            hint="1 means no minimum."
            isFigure
            onLeave={followMinOrder}
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping>
            name="orderStep"
            label="Sold in steps of"
            hint="5 means 25, 30, 35."
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping>
            name="mostPerBuyer"
            label="Most for one buyer"
            hint="Empty: no limit."
            isOptional
            isFigure
          />
        </FieldCell>
      </FieldRow>
      <TiersEditor />
    </FormGroup>
  )
}
