import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { StockSheet } from './stock-sheet'

import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { OwnListing } from '@/shared/contracts/listings'
import { printCount } from '@/shared/units/count'

const places: readonly { key: keyof OwnListing['stock']; name: string; meaning: string }[] = [
  { key: 'free', name: 'Free', meaning: 'for sale now' },
  { key: 'held', name: 'Held', meaning: 'somebody is paying, or waits for your answer' },
  { key: 'pledged', name: 'Pledged', meaning: 'in a pooled run' },
  { key: 'sold', name: 'Sold', meaning: 'deposit paid, not collected yet' },
  { key: 'shipped', name: 'Under way', meaning: 'sent, not arrived yet' },
  { key: 'delivered', name: 'Handed over', meaning: '' },
]

/** Where every fish of the batch is. A correction always names its reason. */
export function StockCard({ own }: { own: OwnListing }) {
  const [isOpen, setIsOpen] = useState(false)
  const isKept = own.liveVersion !== undefined && own.may.includes('edit')
  const shown = places.filter(({ key }) => key === 'free' || own.stock[key] > 0)
  return (
    <Card>
      <Heading level={2} size="lead">
        Stock
      </Heading>
      {shown.map(({ key, name, meaning }) => (
        <View key={key} style={styles.row}>
          <View style={styles.words}>
            <Text face={key === 'free' ? 'strong' : 'body'}>{name}</Text>
            {meaning ? (
              <Text size="small" tint="muted">
                {meaning}
              </Text>
            ) : null}
          </View>
          <Text size={key === 'free' ? 'lead' : 'body'} face="strong" isFigures>
            {printCount(own.stock[key])}
          </Text>
        </View>
      ))}
      {isKept ? (
        <Button
          kind="secondary"
          icon="scale"
          label="Correct the free count"
          onPress={() => setIsOpen(true)}
        />
      ) : null}
      {isOpen ? <StockSheet own={own} onClose={() => setIsOpen(false)} /> : null}
    </Card>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.lg,
    paddingTop: space.sm,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
  words: { flex: 1 },
})
