import { StyleSheet, View } from 'react-native'

import { peopleWords, reportLabels } from './report-words'

import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

/** How many people, and the newest of what they say, in their words. */
export function ReportList({ row }: { row: ReportedListing }) {
  return (
    <View style={styles.frame}>
      <Text size="note" face="strong">
        {peopleWords(row.people)}
      </Text>
      {row.newest.map(({ reason, words, reportedAt }, at) => (
        <Text key={`${reportedAt} ${at}`} size="note">
          {words ? `${reportLabels[reason]}: “${words}”` : reportLabels[reason]}
        </Text>
      ))}
      {row.people > row.newest.length ? (
        <Text size="small" tint="muted">
          {`and ${row.people - row.newest.length} more`}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.xs } })
