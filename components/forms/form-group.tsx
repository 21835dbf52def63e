import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

interface Props {
  title: string
  intro?: string
  /** Names the group as a place to jump to. */
  groupId: string
  children: ReactNode
}

/** Questions that belong together: a card on a wide screen, the whole step on a phone. */
export function FormGroup({ title, intro, groupId, children }: Props) {
  const isPhone = useBreakpoint() === 'phone'
  const headingId = `${groupId}-heading`
  return (
    <View role="group" aria-labelledby={headingId} style={[styles.group, isPhone ? null : styles.card]}>
      <View style={styles.head}>
        <Heading level={2} nativeID={headingId} size={isPhone ? 'title' : 'lead'}>
          {title}
        </Heading>
        {intro ? (
          <Text size="note" tint="muted">
            {intro}
          </Text>
        ) : null}
      </View>
      {children}
    </View>
  )
}

/** Short fields side by side, wrapping where there is no room. */
export function FieldRow({ children }: { children: ReactNode }) {
  return <View style={styles.row}>{children}</View>
}

/** One field of a row. */
export function FieldCell({ children, minPx = 140 }: { children: ReactNode; minPx?: number }) {
  return <View style={[styles.cell, { minWidth: minPx }]}>{children}</View>
}

const styles = StyleSheet.create({
  group: { gap: space.xl },
  card: {
    backgroundColor: color.card,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    padding: space.xl,
  },
  head: { gap: space.xs },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    columnGap: space.lg,
    rowGap: space.lg,
    alignItems: 'flex-start',
  },
  cell: { flexGrow: 1, flexShrink: 1, flexBasis: 0 },
})
