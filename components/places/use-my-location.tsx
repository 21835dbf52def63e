import { useState } from 'react'

import { ownCell } from './own-cell'

import { Button } from '@/components/ui/button'

interface Props {
  onCell: (cell: string) => Promise<void>
  onFault: (sentence: string) => void
}

const faults = {
  refused: 'Your browser keeps the location to itself. Type a ZIP code instead.',
  unknown: 'Your device could not say where it is. Type a ZIP code instead.',
}

export function UseMyLocation({ onCell, onFault }: Props) {
  const [isBusy, setIsBusy] = useState(false)
  async function locate() {
    setIsBusy(true)
    const answer = await ownCell()
    if ('cell' in answer) await onCell(answer.cell)
    else onFault(faults[answer.why])
    setIsBusy(false)
  }
  return (
    <Button
      kind="quiet"
      icon="pin"
      label="Use my location"
      busyLabel="Asking your device"
      isBusy={isBusy}
      onPress={() => void locate()}
    />
  )
}
