import { DepositExample } from './deposit-example'

import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { Text } from '@/components/ui/text'

import type { BatchTyping } from './batch-typing'

const remedies = [
  {
    value: 'refund',
    label: 'Refund the missing fish',
    hint: 'At the price paid, after the free extra fish.',
  },
  { value: 'replace', label: 'Replace them', hint: 'Only where the buyer agrees; otherwise a refund.' },
]
const survival = [
  { value: '0', label: 'None' },
  ...[3, 4, 5, 6, 7].map((days) => ({ value: String(days), label: `${days} days alive` })),
]

export function PromiseGroup() {
  return (
    <FormGroup groupId="promise" title="Deposit and promise">
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="depositPct"
            label="Deposit"
            hint="10 to 50 %. 25 % is usual."
            suffix="%"
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping>
            name="freeCancelHours"
            label="Free to cancel until"
            hint="Before the pickup. 72 is usual."
            suffix="hours"
            isFigure
          />
        </FieldCell>
      </FieldRow>
      <DepositExample />
      <Text size="note" tint="muted">
        If the buyer does not come, you mark it 60 minutes after the window: you keep the deposit and the
        fish, and the rest goes back to the buyer. If you cancel, everything goes back.
      </Text>
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="promise.windowHours"
            label="Time to tell losses"
            hint="After hand-over, 4 to 24."
            suffix="hours"
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundChoice<BatchTyping>
            name="promise.survivalDays"
            label="Survival promise"
            hint="Beyond that, if you like."
            choices={survival}
            isFolded
          />
        </FieldCell>
      </FieldRow>
      <BoundText<BatchTyping>
        name="promise.evidence"
        label="What should the buyer show you?"
        maxLength={200}
      />
      <BoundChoice<BatchTyping> name="promise.remedy" label="How do you make it good?" choices={remedies} />
    </FormGroup>
  )
}
