import { useState } from 'react'

import { PaperFields } from './paper-fields'
import { blankPaper, namedPapers, paperErrors, paperRows } from './papers'
import { Refusals } from './refusals'

import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { ShownShipment } from '@/shared/contracts/shipments'

interface Props {
  order: ShownOrder
  shipment: ShownShipment
  onClose: () => void
}

const MOST = 10

/** The papers that travel with the animals: those that a rule asks for are there by name. */
export function NamePapers({ order, shipment, onClose }: Props) {
  const [rows, setRows] = useState(() => paperRows(shipment.papers, shipment.papersNeeded))
  const [attempt, setAttempt] = useState(0)
  const keep = useFilledAct('keepRoutePapers', order.orderId)
  const errors = paperErrors(rows)
  const shown = attempt > 0 ? errors : []
  const send = () => {
    setAttempt(attempt + 1)
    if (errors.length === 0) keep.mutate({ papers: namedPapers(rows) }, { onSuccess: onClose })
  }
  return (
    <Sheet
      title="Papers for the way"
      isOpen
      onClose={onClose}
      footer={
        <Button
          label="Keep these papers"
          isWide
          isBusy={keep.isPending}
          busyLabel="Keeping them"
          onPress={send}
        />
      }
    >
      <ErrorSummary errors={shown} attempt={attempt} />
      <Refusals error={keep.error} title="Not kept" />
      <Text>
        {shipment.papersNeeded.length > 0
          ? 'Rules that we found ask for the papers below. A row you leave empty stays open; the box cannot be sent before it is filled.'
          : 'No rule that we found asks for a paper here. Name what travels with them all the same.'}
      </Text>
      {rows.map((row, at) => (
        <PaperFields
          // Rows have no name of their own: they are only added at the end or taken off by their place.
          key={at}
          at={at}
          paper={row}
          isNeeded={shipment.papersNeeded.includes(row.kind)}
          errorAt={(fieldId) => shown.find((one) => one.fieldId === fieldId)?.message}
          onChange={(paper) => setRows(rows.map((one, index) => (index === at ? paper : one)))}
          onRemove={() => setRows(rows.filter((_, index) => index !== at))}
        />
      ))}
      {rows.length < MOST ? (
        <Button
          kind="secondary"
          icon="plus"
          label="Another paper"
          onPress={() => setRows([...rows, blankPaper('')])}
        />
      ) : null}
    </Sheet>
  )
}
