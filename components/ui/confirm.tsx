import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Button } from './button'
import { Sheet } from './sheet'
import { Text } from './text'

import { space } from '@/constants/theme'

interface Props {
  /** The question: "Cancel this order?" */
  title: string
  isOpen: boolean
  /** What will happen, with its cents and dates. */
  children: ReactNode
  /** The act: "Cancel and refund $12.00". */
  actLabel: string
  keepLabel: string
  isDanger?: boolean
  isBusy?: boolean
  busyLabel?: string
  onAct: () => void
  onClose: () => void
}

export function Confirm(props: Props) {
  const { title, isOpen, children, actLabel, keepLabel, isDanger, isBusy, busyLabel, onAct, onClose } = props
  const buttons = (
    <View style={styles.buttons}>
      <Button
        kind={isDanger ? 'danger' : 'primary'}
        label={actLabel}
        isBusy={isBusy}
        busyLabel={busyLabel}
        onPress={onAct}
      />
      <Button kind="secondary" label={keepLabel} onPress={onClose} />
    </View>
  )
  return (
    <Sheet title={title} isOpen={isOpen} onClose={onClose} shape="dialog" footer={buttons}>
      {typeof children === 'string' ? <Text>{children}</Text> : children}
    </Sheet>
  )
}

const styles = StyleSheet.create({ buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm } })
