import type { ReactNode } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'

import { color, layout, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

interface Column {
  /** Names the column for readers: "Filters". */
  label: string
  content: ReactNode
}

interface Props {
  filters: Column
  main: Column
  map: Column
}

/**
 * Wide: filters, results, map, each scrolling by itself. Middle: results and map. Phone: results.
 * Where a column is not shown, its screen offers it as a sheet or a toggle. Use in a Page that is not scrolled.
 */
export function ThreeColumns({ filters, main, map }: Props) {
  const breakpoint = useBreakpoint()
  return (
    <View style={styles.row}>
      {breakpoint === 'wide' ? (
        <View role="complementary" aria-label={filters.label} style={styles.filters}>
          <ScrollView contentContainerStyle={styles.pad}>{filters.content}</ScrollView>
        </View>
      ) : null}
      <View
        role="region"
        aria-label={main.label}
        style={[styles.main, breakpoint === 'middle' ? styles.roomyMain : null]}
      >
        {main.content}
      </View>
      {breakpoint === 'phone' ? null : (
        <View role="region" aria-label={map.label} style={styles.map}>
          {map.content}
        </View>
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flex: 1, flexDirection: 'row', minHeight: 0, gap: space.lg },
  filters: { width: layout.filtersPx, borderRightWidth: 1, borderRightColor: color.line },
  pad: { paddingRight: space.lg, paddingBottom: space.xxl, gap: space.lg },
  main: { flex: 1.1, minWidth: 0 },
  roomyMain: { flex: 1.6 },
  map: { flex: 1, minWidth: 0 },
})
