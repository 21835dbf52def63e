import { StyleSheet, View } from 'react-native'

import type { ReportedActs } from './reported-list'

import { Button } from '@/components/ui/button'
import { space } from '@/constants/theme'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

export function ReportedButtons({ row, acts }: { row: ReportedListing; acts: ReportedActs }) {
  return (
    <View role="group" aria-label={`Decide on ${row.title} by ${row.farmName}`} style={styles.bar}>
      <Button kind="secondary" label="Nothing wrong" onPress={() => acts.onDecide('dismiss', row)} />
      <Button kind="danger" label="Take off sale" onPress={() => acts.onDecide('take-down', row)} />
    </View>
  )
}

const styles = StyleSheet.create({ bar: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm } })
