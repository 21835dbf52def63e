import { StyleSheet, View } from 'react-native'

import { Badge } from '@/components/ui/badge'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { Me } from '@/shared/contracts/members'

export function SecurityCard({ secondFactor }: Pick<Me, 'secondFactor'>) {
  const { enabled, required } = secondFactor
  return (
    <Card>
      <View style={styles.head}>
        <Heading level={2} size="lead">
          Second factor
        </Heading>
        <Badge
          word={enabled ? 'On' : 'Off'}
          tone={enabled ? 'safe' : required ? 'danger' : 'neutral'}
          icon={enabled ? 'shield' : 'lock'}
        />
      </View>
      <Text tint="muted">
        {enabled
          ? 'Signing in asks for a code from your app after the password.'
          : 'A code from an app on your phone, asked after the password. A stolen password alone then opens nothing.'}
      </Text>
      {required && !enabled ? (
        <Text face="strong" tint="danger">
          Moderators and admins must set it up before the moderation desk opens.
        </Text>
      ) : null}
      <ButtonLink
        kind={required && !enabled ? 'primary' : 'secondary'}
        href="/me/second-factor"
        label={enabled ? 'Second factor settings' : 'Set up a second factor'}
      />
    </Card>
  )
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', gap: space.sm },
})
