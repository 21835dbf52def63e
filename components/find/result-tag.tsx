import { StyleSheet, View } from 'react-native'

import { foundFacts } from './found-facts'
import { pinOf } from './pins'
import type { Find } from './use-find'

import { Tag } from '@/components/listings/tag'
import { color, radius } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import type { FoundListing } from '@/shared/contracts/search'

interface Props {
  found: FoundListing
  find: Find
  isFirst: boolean
  selectedPin: string
  /** Told which pin the pointer is over, '' when it leaves. */
  onHot: (pin: string) => void
}

export function ResultTag({ found, find, isFirst, selectedPin, onHot }: Props) {
  const units = useUnits()
  const pin = pinOf(found)
  const facts = foundFacts(found, {
    units,
    count: find.state.count,
    state: find.place?.state,
    near: find.isElsewhere ? find.near : undefined,
  })
  return (
    <View
      role="listitem"
      nativeID={resultId(found.listingId)}
      onPointerEnter={() => onHot(pin)}
      onPointerLeave={() => onHot('')}
      style={[styles.frame, selectedPin === pin ? styles.selected : null]}
    >
      <Tag facts={facts} size="row" isFirst={isFirst} />
    </View>
  )
}

export const resultId = (listingId: string) => `found-${listingId}`

const styles = StyleSheet.create({
  frame: { borderRadius: radius.tag + 4, borderWidth: 2, borderColor: 'transparent', margin: -4, padding: 2 },
  selected: { borderColor: color.netting },
})
