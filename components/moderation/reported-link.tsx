import { StyleSheet, View } from 'react-native'

import type { ReportedActs } from './reported-list'

import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { touchPx } from '@/constants/theme'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

/** To the page as everybody sees it. While the keyboard is on it, w and t decide on this listing. */
export function ReportedLink({ row, acts }: { row: ReportedListing; acts: ReportedActs }) {
  return (
    <View onFocus={() => acts.onRow(row)} onBlur={() => acts.onRow(null)}>
      <PressLink
        href={{ pathname: '/listings/[listingId]', params: { listingId: row.listingId } }}
        nativeID={`desk-row-${row.listingId}`}
        look={() => styles.link}
      >
        <Text size="note" face="strong" tint="netting" style={styles.title}>
          {row.title}
        </Text>
      </PressLink>
    </View>
  )
}

const styles = StyleSheet.create({
  link: { minHeight: touchPx, justifyContent: 'center' },
  title: { textDecorationLine: 'underline' },
})
