import { StyleSheet, View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { BatchDeskProps } from './batch-desk-props'

type Props = Pick<BatchDeskProps, 'draftState' | 'onLoadNewer' | 'onKeepMine' | 'onUnshelve'>

/** Two drafts of one batch: both are kept, the seller says which to go on with. */
export function StaleBanner({ draftState, onLoadNewer, onKeepMine, onUnshelve }: Props) {
  if (draftState.kind !== 'stale') return onUnshelve ? <Shelved onUnshelve={onUnshelve} /> : null
  return (
    <Banner tone="caution" title="This batch was changed somewhere else" isLive>
      <Text size="note">
        Perhaps on another device. What you typed here and the newer draft are both kept; whichever you set
        aside can be brought back.
      </Text>
      <View style={styles.acts}>
        <Button kind="secondary" label="Load the newer one" onPress={onLoadNewer} />
        <Button kind="quiet" label="Go on with mine" onPress={onKeepMine} />
      </View>
    </Banner>
  )
}

function Shelved({ onUnshelve }: { onUnshelve: () => void }) {
  return (
    <Banner tone="info" title="Your other version is set aside">
      <Text size="note">It stays until you leave this page.</Text>
      <View style={styles.acts}>
        <Button kind="quiet" label="Use that one instead" onPress={onUnshelve} />
      </View>
    </Banner>
  )
}

const styles = StyleSheet.create({ acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm } })
