import { useEffect } from 'react'
import { StyleSheet, View } from 'react-native'

import { pinOf } from './pins'
import { resultId, ResultTag } from './result-tag'
import { showElement } from './show-element'
import type { Find } from './use-find'

import { space } from '@/constants/theme'

interface Props {
  find: Find
  /** '' before one was pressed. */
  pin: string
}

const noHover = () => undefined

/** What hangs at the pin that was pressed: on a phone the list is away while the map is there. */
export function PinTags({ find, pin }: Props) {
  const here = find.found.filter((listing) => pinOf(listing) === pin)
  const firstId = here[0]?.listingId
  useEffect(() => {
    if (firstId) showElement(resultId(firstId))
  }, [firstId])
  if (here.length === 0) return null
  return (
    <View role="list" aria-label="Listings at this place" style={styles.list}>
      {here.map((found, index) => (
        <ResultTag
          key={found.listingId}
          found={found}
          find={find}
          isFirst={index === 0}
          selectedPin=""
          onHot={noHover}
        />
      ))}
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: space.md } })
