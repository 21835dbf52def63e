import { useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { Button } from '@/components/ui/button'
import { Heading } from '@/components/ui/heading'
import { color, radius, space } from '@/constants/theme'
import { findState } from '@/shared/domain/rules/find-state'

import type { FarmTyping } from './farm-typing'

const answers = [
  { value: 'have', label: 'I have a licence or permit' },
  { value: 'not-needed', label: 'None is needed for what I sell' },
  { value: 'unsure', label: 'I am not sure yet', hint: 'You can list; a moderator reads it first.' },
]

interface Props {
  at: number
  state: string
  /** The farm's own state keeps its question. */
  onRemove?: () => void
}

export function LicenceRow({ at, state, onRemove }: Props) {
  const answer = useWatch<FarmTyping, `licences.${number}.answer`>({ name: `licences.${at}.answer` })
  const name = findState(state)?.name ?? state
  return (
    <View style={styles.row}>
      <Heading level={3} size="body">
        {name}
      </Heading>
      <BoundChoice<FarmTyping>
        name={`licences.${at}.answer`}
        label={`A licence to sell live animals in ${name}?`}
        choices={answers}
      />
      {answer === 'have' ? (
        <BoundText<FarmTyping> name={`licences.${at}.number`} label="Its number" maxLength={60} />
      ) : null}
      {onRemove ? (
        <Button
          kind="quiet"
          icon="trash"
          label="Remove"
          spokenLabel={`Remove ${name}`}
          onPress={onRemove}
          style={styles.remove}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  row: {
    gap: space.md,
    padding: space.lg,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
  },
  remove: { marginLeft: -space.md },
})
