import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { leastPassword } from './account-checks'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { HiddenText } from '@/components/ui/hidden-text'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

interface Props {
  label: string
  value: string
  onChangeText: (text: string) => void
  onSubmit: () => void
  fieldId: string
  error?: string
  /** A new one counts its characters while it is typed. */
  isNew?: boolean
}

export function PasswordField({ label, isNew, onSubmit, ...field }: Props) {
  const [isShown, setIsShown] = useState(false)
  return (
    <View style={styles.frame}>
      <Field
        {...field}
        label={label}
        hint={isNew ? 'Three or four unrelated words make a good one. Pasting is fine.' : undefined}
        secureTextEntry={!isShown}
        autoComplete={isNew ? 'new-password' : 'current-password'}
        autoCapitalize="none"
        spellCheck={false}
        enterKeyHint="go"
        onSubmitEditing={onSubmit}
      />
      <View style={styles.below}>
        {isNew ? <LengthSoFar typed={field.value.length} /> : null}
        <Button
          kind="quiet"
          icon="eye"
          label={isShown ? 'Hide password' : 'Show password'}
          onPress={() => setIsShown(!isShown)}
          style={styles.show}
        />
      </View>
    </View>
  )
}

function LengthSoFar({ typed }: { typed: number }) {
  const isEnough = typed >= leastPassword
  return (
    <View style={styles.length}>
      {isEnough ? <Icon name="check" sizePx={18} tint="safe" /> : null}
      <Text size="note" tint={isEnough ? 'safe' : 'muted'} isFigures>
        {isEnough ? `${typed} characters: long enough` : `${typed} of at least ${leastPassword} characters`}
      </Text>
      <HiddenText isLive>{isEnough ? 'Long enough' : ''}</HiddenText>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs },
  below: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.sm },
  length: { flexDirection: 'row', alignItems: 'center', gap: space.xs, flexGrow: 1 },
  show: { marginLeft: 'auto' },
})
