import { StyleSheet, View } from 'react-native'

import { DiscardAct } from './discard-act'
import { DraftLine } from './draft-line'
import { NextNote } from './next-note'
import { PreviewTag } from './preview-tag'

import { Button } from '@/components/ui/button'
import { space } from '@/constants/theme'

import type { BatchDeskProps } from './batch-desk-props'

export function PublishPanel({ own, setting, draftState, publishing }: BatchDeskProps) {
  return (
    <View style={styles.panel}>
      <PreviewTag farm={setting.farm} units={setting.units} />
      <View style={styles.acts}>
        <DraftLine state={draftState} />
        <Button
          label="Publish this batch"
          isWide
          isBusy={publishing.isBusy}
          busyLabel="Publishing"
          isDisabled={!own.may.includes('submit')}
          onPress={() => void publishing.publish()}
        />
        <NextNote own={own} />
        <DiscardAct own={own} />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({ panel: { gap: space.lg }, acts: { gap: space.sm } })
