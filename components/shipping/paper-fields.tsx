import { StyleSheet, View } from 'react-native'

import { paperFieldId, type PaperTyping } from './papers'

import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { DateField } from '@/components/ui/date-field'
import { Field } from '@/components/ui/field'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

interface Props {
  at: number
  paper: PaperTyping
  /** A rule asks for it: its name is not the seller's to change. */
  isNeeded: boolean
  errorAt: (fieldId: string) => string | undefined
  onChange: (paper: PaperTyping) => void
  onRemove: () => void
}

export function PaperFields({ at, paper, isNeeded, errorAt, onChange, onRemove }: Props) {
  const part = (name: keyof PaperTyping) => ({
    fieldId: paperFieldId(at, name),
    value: paper[name],
    error: errorAt(paperFieldId(at, name)),
  })
  const change = (name: keyof PaperTyping) => (text: string) => onChange({ ...paper, [name]: text })
  return (
    <Card>
      {isNeeded ? (
        <Text face="strong">{paper.kind}</Text>
      ) : (
        <Field label="Which paper" maxLength={160} onChangeText={change('kind')} {...part('kind')} />
      )}
      <Field label="Number" maxLength={60} onChangeText={change('number')} {...part('number')} />
      <Field label="Issued by" maxLength={80} onChangeText={change('issuer')} {...part('issuer')} />
      <View style={styles.days}>
        <View style={styles.day}>
          <DateField label="Issued on" onChange={change('issuedOn')} {...part('issuedOn')} />
        </View>
        <View style={styles.day}>
          <DateField label="Good until" onChange={change('expiresOn')} {...part('expiresOn')} />
        </View>
      </View>
      {isNeeded ? null : <Button kind="quiet" icon="trash" label="Take it off" onPress={onRemove} />}
    </Card>
  )
}

const styles = StyleSheet.create({
  days: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg },
  day: { flexGrow: 1, flexBasis: 150, minWidth: 140 },
})
