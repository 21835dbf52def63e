import { StyleSheet, View } from 'react-native'

import { answerText } from './answer-text'
import { factGroups } from './fact-groups'
import { fieldWords } from './field-words'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { flattenBody } from '@/shared/domain/listings/flatten-body'
import type { ListingBody } from '@/shared/contracts/listings'

export function ReviewFacts({ body }: { body: ListingBody }) {
  const answers = flattenBody(body)
  return (
    <View style={styles.groups}>
      {body.words ? (
        <Card style={styles.group}>
          <Heading level={2} size="lead">
            Own words
          </Heading>
          <Text>{body.words}</Text>
        </Card>
      ) : null}
      {factGroups.map(({ title, fields }) => (
        <Card key={title} style={styles.group}>
          <Heading level={2} size="lead">
            {title}
          </Heading>
          {fields.map((field) => {
            const text = answerText(field, answers.get(field))
            return text ? <Fact key={field} name={fieldWords(field)} text={text} /> : null
          })}
        </Card>
      ))}
    </View>
  )
}

function Fact({ name, text }: { name: string; text: string }) {
  return (
    <View style={styles.fact}>
      <Text size="note" tint="muted" style={styles.name}>
        {name}
      </Text>
      <Text size="note" isFigures style={styles.text}>
        {text}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  groups: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg },
  group: { flexGrow: 1, flexBasis: 320, minWidth: 0, gap: space.sm },
  fact: {
    flexDirection: 'row',
    gap: space.md,
    paddingTop: space.sm,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
  name: { width: 144 },
  text: { flex: 1, minWidth: 0 },
})
