import { StyleSheet, View } from 'react-native'

import { ageWords } from './age-words'
import { ReportList } from './report-list'
import { ReportedButtons } from './reported-buttons'
import { ReportedLink } from './reported-link'
import type { ReportedActs } from './reported-list'

import { TagPiece } from '@/components/listings/tag-piece'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

/** A reported listing on the phone: what, whose, what is said, for how long, and the two acts. */
export function ReportedTag({ row, acts }: { row: ReportedListing; acts: ReportedActs }) {
  return (
    <View role="listitem">
      <TagPiece kind="body" seam="bottom">
        <View style={styles.words}>
          <ReportedLink row={row} acts={acts} />
          <Text size="note" tint="muted">
            {`${row.farmName}, waits ${ageWords(Date.parse(row.firstAt), acts.nowMs)}`}
          </Text>
          <ReportList row={row} />
        </View>
      </TagPiece>
      <TagPiece kind="stub" seam="bottom">
        <View style={styles.stub}>
          <ReportedButtons row={row} acts={acts} />
        </View>
      </TagPiece>
    </View>
  )
}

const styles = StyleSheet.create({
  words: { gap: space.xs, padding: space.md, paddingLeft: 48 },
  stub: { padding: space.md },
})
