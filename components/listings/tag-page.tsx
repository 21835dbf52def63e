import { StyleSheet, View } from 'react-native'

import {
  TagBadges,
  TagCells,
  TagPhoto,
  TagPlace,
  TagPrice,
  TagSizeLine,
  TagTitle,
  type TitleLevel,
} from './tag-parts'
import { TagPiece } from './tag-piece'

import { color, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

import type { TagFacts } from './tag-facts'

interface Props {
  facts: TagFacts
  level: TitleLevel
}

/** The tag at the head of a listing, an order or a printed sheet. */
export function TagPage({ facts, level }: Props) {
  const isPhone = useBreakpoint() === 'phone'
  const seam = isPhone ? 'bottom' : 'right'
  return (
    <View style={isPhone ? null : styles.row}>
      <TagPiece kind="body" seam={seam} style={isPhone ? null : styles.body}>
        <View style={isPhone ? null : styles.inside}>
          {facts.photoUrl ? (
            <View style={isPhone ? styles.photoAbove : styles.photoBeside}>
              <TagPhoto facts={facts} isFirst />
            </View>
          ) : null}
          <View
            style={[
              styles.words,
              isPhone ? styles.narrowWords : null,
              facts.photoUrl ? null : styles.pastHole,
            ]}
          >
            <TagTitle facts={facts} size="page" level={level} />
            <TagSizeLine facts={facts} size="page" />
            <TagCells facts={facts} size="page" />
            <TagBadges badges={facts.badges} />
          </View>
        </View>
      </TagPiece>
      <TagPiece kind="stub" seam={seam} style={isPhone ? null : styles.stub}>
        <View style={[styles.stubInside, isPhone ? styles.below : styles.beside]}>
          <TagPrice facts={facts} size="page" />
          <TagPlace facts={facts} size="page" isAtEnd={isPhone} />
        </View>
      </TagPiece>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'stretch' },
  body: { flex: 1, minWidth: 0 },
  inside: { flexDirection: 'row', flexGrow: 1 },
  photoAbove: { width: '100%', aspectRatio: 1.5 },
  photoBeside: { width: '38%', minHeight: 260 },
  words: { flex: 1, minWidth: 0, padding: space.xl, gap: space.md },
  narrowWords: { flexGrow: 1, flexShrink: 0, flexBasis: 'auto', padding: space.lg },
  pastHole: { paddingLeft: 48 },
  stub: { width: 200 },
  stubInside: {
    flexGrow: 1,
    justifyContent: 'space-between',
    gap: space.lg,
    padding: space.lg,
    borderStyle: 'dotted',
  },
  beside: { paddingVertical: space.xl, borderLeftWidth: 2, borderLeftColor: color.edge },
  below: { flexDirection: 'row', borderTopWidth: 2, borderTopColor: color.edge },
})
