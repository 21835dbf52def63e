import { StyleSheet, View } from 'react-native'

import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

import type { IconName } from '@/components/ui/icon-paths'
import type { Me } from '@/shared/contracts/members'

const lines: readonly { icon: IconName; text: string }[] = [
  {
    icon: 'edit',
    text: 'You say what you have: species, inches, count, price, and when people may collect.',
  },
  {
    icon: 'money',
    text: 'Buyers pay a deposit first, and the rest before you hand over. It is held until the fish are alive in hand.',
  },
  {
    icon: 'lock',
    text: 'Your address stays hidden until a pickup is scheduled. No card numbers, no forty messages.',
  },
]

/** What selling here means, for whoever does not sell yet. */
export function StartSelling({ me }: { me: Me | null }) {
  return (
    <Card style={styles.card}>
      <Heading level={2} size="lead">
        Sell what you raise to growers near you
      </Heading>
      <View role="list" style={styles.list}>
        {lines.map(({ icon, text }) => (
          <View key={text} role="listitem" style={styles.line}>
            <View style={styles.ring}>
              <Icon name={icon} sizePx={22} tint="netting" />
            </View>
            <Text style={styles.words}>{text}</Text>
          </View>
        ))}
      </View>
      {me ? (
        <ButtonLink href="/sell/farm" icon="sell" label="Start selling" />
      ) : (
        <View style={styles.acts}>
          <ButtonLink
            href={{ pathname: '/sign-up', params: { returnTo: '/sell/farm' } }}
            icon="sell"
            label="Start selling"
          />
          <ButtonLink
            kind="secondary"
            href={{ pathname: '/sign-in', params: { returnTo: '/sell' } }}
            label="I have an account"
          />
        </View>
      )}
    </Card>
  )
}

const styles = StyleSheet.create({
  card: { gap: space.xl, maxWidth: 640, padding: space.xl },
  list: { gap: space.lg },
  line: { flexDirection: 'row', gap: space.lg, alignItems: 'center' },
  ring: {
    width: 44,
    height: 44,
    borderRadius: radius.full,
    backgroundColor: color.sunk,
    alignItems: 'center',
    justifyContent: 'center',
  },
  words: { flex: 1 },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
})
