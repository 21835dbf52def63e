import { useId, useState, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

interface Props {
  /** What stands in it now, so that it need not be opened to be read. */
  summary: string
  label: string
  /** Open from the start: something in it is still to answer. */
  isOpenFirst?: boolean
  children: ReactNode
}

/** Answers remembered from last time: read in one line, changed behind one tap. */
export function Fold({ summary, label, isOpenFirst = false, children }: Props) {
  const [isOpen, setIsOpen] = useState(isOpenFirst)
  const id = useId()
  if (isOpen) {
    return (
      <View nativeID={id} style={styles.open}>
        {children}
      </View>
    )
  }
  return (
    <View style={styles.closed}>
      <Text size="note" style={styles.words}>
        {summary}
      </Text>
      <Button
        kind="quiet"
        icon="edit"
        label="Change"
        spokenLabel={`Change: ${label}`}
        isExpanded={false}
        onPress={() => setIsOpen(true)}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  open: { gap: space.lg },
  closed: { flexDirection: 'row', alignItems: 'center', gap: space.md },
  words: { flex: 1, minWidth: 0 },
})
