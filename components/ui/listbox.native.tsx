import type { ReactNode } from 'react'
import { Pressable, ScrollView, StyleSheet } from 'react-native'

import { color, radius, touchPx } from '@/constants/theme'

interface ListboxProps {
  nativeID: string
  label: string
  children: ReactNode
}

export function Listbox({ nativeID, label, children }: ListboxProps) {
  return (
    <ScrollView
      role="list"
      nativeID={nativeID}
      aria-label={label}
      keyboardShouldPersistTaps="handled"
      style={styles.list}
    >
      {children}
    </ScrollView>
  )
}

interface OptionProps {
  nativeID: string
  isActive: boolean
  onChoose: () => void
  children: ReactNode
}

export function Option({ nativeID, isActive, onChoose, children }: OptionProps) {
  return (
    <Pressable
      role="option"
      nativeID={nativeID}
      aria-selected={isActive}
      onPress={onChoose}
      style={styles.option}
    >
      {children}
    </Pressable>
  )
}

const styles = StyleSheet.create({
  list: {
    maxHeight: 300,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.tag,
  },
  option: { justifyContent: 'center', minHeight: touchPx, paddingHorizontal: 12, paddingVertical: 6 },
})
