import { useState } from 'react'
import { StyleSheet } from 'react-native'

import { ownCell } from './own-cell'

import { Button } from '@/components/ui/button'
import { IconButton } from '@/components/ui/icon-button'
import { color, touchPx } from '@/constants/theme'

interface Props {
  onCell: (cell: string) => Promise<void>
  onFault: (sentence: string) => void
  /** Only the sign, where a place is known already and room is short. */
  isSmall?: boolean
}

const faults = {
  refused: 'Your browser keeps the location to itself. Type a ZIP code instead.',
  unknown: 'Your device could not say where it is. Type a ZIP code instead.',
}

export function UseMyLocation({ onCell, onFault, isSmall }: Props) {
  const [isBusy, setIsBusy] = useState(false)
  async function locate() {
    setIsBusy(true)
    const answer = await ownCell()
    if ('cell' in answer) await onCell(answer.cell)
    else onFault(faults[answer.why])
    setIsBusy(false)
  }
  if (isSmall) {
    return (
      <IconButton
        icon="pin"
        label="Use my location"
        tint="netting"
        isDisabled={isBusy}
        onPress={() => void locate()}
        style={styles.small}
      />
    )
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

const styles = StyleSheet.create({
  small: {
    width: touchPx + 4,
    height: touchPx + 4,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
})
