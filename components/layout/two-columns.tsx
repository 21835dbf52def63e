import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

interface Props {
  main: ReactNode
  side: ReactNode
  /** Names the side for readers: "Price and pickup". */
  sideLabel: string
  sidePx?: number
  /** On a phone the side comes first when it holds what must be seen at once. */
  isSideFirst?: boolean
  /** Where the story is a form with much to read, a tablet has no room beside it. */
  needsDesk?: boolean
}

/** A page's story and what goes with it: beside each other where there is room, else one under the other. */
export function TwoColumns({ main, side, sideLabel, sidePx = 340, isSideFirst, needsDesk = false }: Props) {
  const breakpoint = useBreakpoint()
  const isStacked = breakpoint === 'phone' || (needsDesk && breakpoint !== 'wide')
  const sideView = (
    <View
      role="complementary"
      aria-label={sideLabel}
      style={[styles.part, isStacked ? null : { width: sidePx }]}
    >
      {side}
    </View>
  )
  if (isStacked) {
    return (
      <View style={styles.stack}>
        {isSideFirst ? sideView : null}
        <View style={styles.part}>{main}</View>
        {isSideFirst ? null : sideView}
      </View>
    )
  }
  return (
    <View style={styles.row}>
      <View style={[styles.part, styles.grow]}>{main}</View>
      {sideView}
    </View>
  )
}

const styles = StyleSheet.create({
  stack: { gap: space.xl },
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xl },
  part: { gap: space.lg },
  grow: { flex: 1, minWidth: 0 },
})
