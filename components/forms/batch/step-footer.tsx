import { StyleSheet, View } from 'react-native'

import { checkStep } from './batch-steps'
import { DraftLine } from './draft-line'

import { Button } from '@/components/ui/button'
import { space } from '@/constants/theme'

import type { DraftState } from '@/hooks/draft-keeper'

interface Props {
  at: number
  draftState: DraftState
  isBusy: boolean
  mayPublish: boolean
  onBack: () => void
  onNext: () => void
  /** Offered once "next" was refused: open questions can wait, a draft may be unfinished. */
  onLater?: () => void
  onPublish: () => void
}

export function StepFooter(props: Props) {
  const { at, draftState, isBusy, mayPublish, onBack, onNext, onLater, onPublish } = props
  return (
    <View style={styles.foot}>
      <DraftLine state={draftState} />
      <View style={styles.acts}>
        {at > 0 ? <Button kind="secondary" label="Back" onPress={onBack} /> : null}
        {onLater ? <Button kind="secondary" label="Answer later" onPress={onLater} /> : null}
        {at === checkStep ? (
          <Button
            label="Publish this batch"
            isBusy={isBusy}
            busyLabel="Publishing"
            isDisabled={!mayPublish}
            onPress={onPublish}
            style={styles.main}
          />
        ) : (
          <Button label="Next" onPress={onNext} style={styles.main} />
        )}
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  foot: { gap: space.xs },
  acts: { flexDirection: 'row', gap: space.sm },
  main: { flexGrow: 1, alignSelf: 'auto' },
})
