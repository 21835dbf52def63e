import { StyleSheet, View } from 'react-native'

import { TagPiece } from './tag-piece'

import { SkeletonBlock } from '@/components/ui/skeleton'
import { color, space } from '@/constants/theme'

interface Props {
  /** What is on its way: "Loading listings". */
  label: string
  count?: number
}

export function TagSkeleton({ label, count = 4 }: Props) {
  return (
    <View role="status" aria-label={label} aria-busy style={styles.list}>
      {Array.from({ length: count }, (_, index) => (
        <View key={index} style={styles.row}>
          <TagPiece kind="body" seam="right" style={styles.body}>
            <View style={styles.inside}>
              <View style={styles.photo} dataSet={{ pulse: '' }} />
              <View style={styles.words}>
                <SkeletonBlock width="70%" heightPx={22} />
                <SkeletonBlock width="45%" heightPx={14} />
                <SkeletonBlock width="55%" heightPx={20} />
                <SkeletonBlock width="80%" heightPx={14} />
              </View>
            </View>
          </TagPiece>
          <TagPiece kind="stub" seam="right" style={styles.stub}>
            <View style={styles.stubInside}>
              <SkeletonBlock width="80%" heightPx={22} />
              <SkeletonBlock width="90%" heightPx={14} />
            </View>
          </TagPiece>
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.md },
  row: { flexDirection: 'row', alignItems: 'stretch' },
  body: { flex: 1, minWidth: 0 },
  inside: { flexDirection: 'row', flexGrow: 1, minHeight: 148 },
  photo: { width: 80, backgroundColor: color.sunk },
  words: { flex: 1, padding: space.md, gap: space.md },
  stub: { width: 104 },
  stubInside: {
    flexGrow: 1,
    justifyContent: 'space-between',
    padding: space.md,
    borderLeftWidth: 2,
    borderStyle: 'dotted',
    borderLeftColor: color.edge,
  },
})
