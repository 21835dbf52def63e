import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { ageWords } from './age-words'
import { FlagList } from './flag-list'
import { versionWords } from './queue-table'

import { TagPiece } from '@/components/listings/tag-piece'
import { Heading } from '@/components/ui/heading'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, font, radius, space } from '@/constants/theme'
import type { ReviewRow } from '@/shared/contracts/moderation'

interface Props {
  row: ReviewRow
  nowMs: number
}

/** The tag as it hangs in the queue: what it is, why it waits, and on the stub for how long. */
export function QueueTag({ row, nowMs }: Props) {
  const [isHot, setIsHot] = useState(false)
  return (
    <View role="listitem">
      <PressLink
        href={{ pathname: '/moderate/listings/[versionId]', params: { versionId: row.versionId } }}
        nativeID={`desk-row-${row.versionId}`}
        look={() => styles.link}
        onHotChange={setIsHot}
      >
        <View style={styles.row}>
          <TagPiece kind="body" seam="right" isHot={isHot} style={styles.body}>
            <View style={styles.words}>
              <Heading level={2} size="lead" style={font.species}>
                {row.title}
              </Heading>
              <Text size="note" tint="muted">
                {row.farmName}
              </Text>
              <FlagList flags={row.flags} most={4} />
            </View>
          </TagPiece>
          <TagPiece kind="stub" seam="right" isHot={isHot} style={styles.stub}>
            <View style={styles.stubInside}>
              <Text face="title" size="lead" isFigures>
                {ageWords(Date.parse(row.submittedAt), nowMs)}
              </Text>
              <Text size="small" tint="muted">
                {versionWords(row)}
              </Text>
            </View>
          </TagPiece>
        </View>
      </PressLink>
    </View>
  )
}

const styles = StyleSheet.create({
  link: { borderRadius: radius.tag },
  row: { flexDirection: 'row', alignItems: 'stretch' },
  body: { flex: 1, minWidth: 0 },
  words: { gap: 4, padding: space.md, paddingLeft: 48, minHeight: 104 },
  stub: { width: 96 },
  stubInside: {
    flexGrow: 1,
    justifyContent: 'space-between',
    gap: space.md,
    padding: space.md,
    borderLeftWidth: 2,
    borderStyle: 'dotted',
    borderLeftColor: color.edge,
  },
})
