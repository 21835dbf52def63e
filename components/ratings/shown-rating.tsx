import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { hiddenWords, markKeys, markNames } from './rating-words'

import { Card } from '@/components/ui/card'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { ShownRating } from '@/shared/contracts/ratings'
import { printDay } from '@/shared/times/print-time'

interface Props {
  rating: ShownRating
  children?: ReactNode
}

const dayOf = (at: string) => `${printDay(at, 'UTC')}, ${at.slice(0, 4)}`

/** Marks, words and the seller's reply, as everybody reads them. */
export function ShownRatingCard({ rating, children }: Props) {
  const { marks, reply } = rating
  return (
    <Card>
      <Text face="strong">{rating.buyerName}</Text>
      <Text size="note" tint="muted">
        {dayOf(rating.writtenAt)}
        {rating.editedAt ? `, changed ${dayOf(rating.editedAt)}` : ''}
      </Text>
      <View style={styles.marks}>
        {markKeys.map((key) => (
          <Text key={key} isFigures>
            {`${markNames[key]} ${marks[key]} of 5`}
          </Text>
        ))}
      </View>
      {rating.words ? <Text>{rating.words}</Text> : null}
      {rating.wordsHidden ? <Text tint="muted">{`${hiddenWords(rating.wordsHidden)}.`}</Text> : null}
      {reply ? (
        <View style={styles.reply}>
          <Text size="note" tint="muted">{`The seller replied, ${dayOf(reply.at)}`}</Text>
          {reply.words ? <Text>{reply.words}</Text> : null}
          {reply.hidden ? <Text tint="muted">{`${hiddenWords(reply.hidden)}.`}</Text> : null}
        </View>
      ) : null}
      {children}
    </Card>
  )
}

const styles = StyleSheet.create({
  marks: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.lg, rowGap: space.xs },
  reply: { borderLeftWidth: 2, borderLeftColor: color.line, paddingLeft: space.md, gap: space.xs },
})
