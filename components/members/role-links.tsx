import { StyleSheet, View } from 'react-native'

import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { Me } from '@/shared/contracts/members'

export function RoleLinks({ me }: { me: Me }) {
  const isStaff = me.roles.includes('moderator') || me.roles.includes('admin')
  const { reviews } = me.waiting
  return (
    <Card>
      <Heading level={2} size="lead">
        Selling{isStaff ? ' and moderating' : ''}
      </Heading>
      {me.sellerId ? null : (
        <Text tint="muted">
          Raise fry, worms or greens? Name your farm, and list a batch in five minutes.
        </Text>
      )}
      <View style={styles.links}>
        <ButtonLink
          kind="secondary"
          icon="sell"
          href="/sell"
          label={me.sellerId ? 'Your selling desk' : 'Start selling'}
        />
        {me.sellerId ? (
          <ButtonLink
            kind="secondary"
            icon="eye"
            href={{ pathname: '/sellers/[sellerId]', params: { sellerId: me.sellerId } }}
            label="Your public page"
          />
        ) : null}
        {isStaff ? (
          <ButtonLink
            kind="secondary"
            icon="shield"
            href="/moderate"
            label={reviews > 0 ? `Moderate (${reviews} waiting)` : 'Moderate'}
          />
        ) : null}
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({ links: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md } })
