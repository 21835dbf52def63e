import { useState } from 'react'

import { stockChange, stockReasons, type StockReason } from './stock-change'

import { Button } from '@/components/ui/button'
import { ErrorSummary, type FormError } from '@/components/ui/error-summary'
import { Field } from '@/components/ui/field'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { newRequestKey } from '@/hooks/request-key'
import { useAdjustStock } from '@/hooks/use-own-listings'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'
import { printCount } from '@/shared/units/count'

const choices = (Object.keys(stockReasons) as StockReason[]).map((reason) => ({
  value: reason,
  label: stockReasons[reason].label,
  hint: stockReasons[reason].hint,
}))

interface Props {
  own: OwnListing
  onClose: () => void
}

/** Mounted only while it is open, so that each correction is a command of its own. */
export function StockSheet({ own, onClose }: Props) {
  const { free } = own.stock
  const toast = useToast()
  const adjust = useAdjustStock(own.listingId)
  const [reason, setReason] = useState<StockReason>('die-off')
  const [count, setCount] = useState('')
  const [note, setNote] = useState('')
  const [key, setKey] = useState(newRequestKey)
  const [attempt, setAttempt] = useState(0)
  const [errors, setErrors] = useState<FormError[]>([])
  const change = stockChange(reason, count, free)

  function refuse(message: string) {
    setErrors([{ fieldId: 'stock-count', message }])
    setAttempt((tries) => tries + 1)
  }
  function send() {
    setErrors([])
    if (change === null) return refuse('A whole number of fish, please.')
    if (free + change < 0)
      return refuse(`Only ${printCount(free)} are free. Settle the others with their buyers.`)
    adjust.mutate(
      { change: { change, reason, ...(note.trim() ? { note: note.trim() } : {}) }, key },
      {
        onSuccess: (now) => {
          toast({ tone: 'safe', text: `${printCount(now.stock.free)} fish are free now.` })
          onClose()
        },
        onError: (error) => {
          if (error instanceof Problem) setKey(newRequestKey())
          refuse(error.message)
        },
      },
    )
  }

  return (
    <Sheet
      title="Correct the free count"
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Correct the count"
          isWide
          isBusy={adjust.isPending}
          busyLabel="Writing it down"
          onPress={send}
        />
      }
    >
      <ErrorSummary errors={errors} attempt={attempt} />
      <RadioGroup label="What happened?" value={reason} choices={choices} onChange={setReason} />
      <NumberField
        fieldId="stock-count"
        label={stockReasons[reason].ask}
        value={count}
        onChangeText={setCount}
        suffix="fish"
        error={errors[0]?.message}
      />
      {change === null ? null : (
        <Text face="strong" isFigures role="status">
          {`${printCount(free)} free now, ${printCount(Math.max(0, free + change))} after.`}
        </Text>
      )}
      <Field label="A note for yourself" isOptional value={note} onChangeText={setNote} maxLength={200} />
    </Sheet>
  )
}
