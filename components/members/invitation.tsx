import { StyleSheet, View } from 'react-native'

import { ThemeSetting } from './theme-setting'

import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

/** Me, for a visitor: what an account is for, and what works without one. */
export function Invitation() {
  return (
    <View style={styles.frame}>
      <Card>
        <Text>
          Looking, comparing and reading work without an account. To hold animals, pay a deposit or sell what
          you raise, make one: a name, an e-mail address and a password.
        </Text>
        <View style={styles.acts}>
          <ButtonLink href={{ pathname: '/sign-up', params: { returnTo: '/me' } }} label="Make an account" />
          <ButtonLink
            kind="secondary"
            href={{ pathname: '/sign-in', params: { returnTo: '/me' } }}
            label="Sign in"
          />
        </View>
      </Card>
      <Card>
        <ThemeSetting />
      </Card>
      <Link href="/tools">Calculators for water, fish and the way home</Link>
      <Link href="/about">What Tankward is, and how your money is held</Link>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
})
