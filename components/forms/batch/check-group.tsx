import { StyleSheet, View } from 'react-native'

import { batchSteps, stepOfField } from './batch-steps'
import { DiscardAct } from './discard-act'
import { NextNote } from './next-note'
import { PreviewTag } from './preview-tag'
import { StepState } from './step-state'
import { useNamedErrors } from './use-named-errors'

import { FormGroup } from '@/components/forms/form-group'
import { space } from '@/constants/theme'

import type { BatchDeskProps } from './batch-desk-props'

interface Props extends Pick<BatchDeskProps, 'own' | 'setting'> {
  onGo: (step: number) => void
}

/** The last step on a phone: the tag as buyers see it, and what is still open. */
export function CheckGroup({ own, setting, onGo }: Props) {
  const errors = useNamedErrors()
  return (
    <FormGroup groupId="check" title="Check and publish">
      <PreviewTag farm={setting.farm} units={setting.units} />
      <View role="list" aria-label="The steps of this batch" style={styles.list}>
        {batchSteps.map((step, at) => (
          <StepState
            key={step.id}
            title={step.title}
            missing={errors.filter((error) => stepOfField(error.name) === at).length}
            onPress={() => onGo(at)}
          />
        ))}
      </View>
      <NextNote own={own} />
      <DiscardAct own={own} />
    </FormGroup>
  )
}

const styles = StyleSheet.create({ list: { gap: space.xs } })
