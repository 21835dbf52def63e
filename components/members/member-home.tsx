import { StyleSheet, View } from 'react-native'

import { Invitation } from './invitation'
import { MailSetting } from './mail-setting'
import { PlaceSetting } from './place-setting'
import { RoleLinks } from './role-links'
import { SecurityCard } from './security-card'
import { SignOut } from './sign-out'

import { NoConnection } from '@/components/listings/no-connection'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import { useOnline } from '@/hooks/use-online'

export function MemberHome() {
  const { me, error, refetch } = useMe()
  const isOnline = useOnline()
  if (me === null) return <Invitation />
  if (!me) {
    if (!isOnline) return <NoConnection kept="Nothing is lost." onRetry={() => void refetch()} />
    if (!error) return <SkeletonRows label="Loading your account" rows={4} />
    return (
      <ErrorState
        title="We could not load your account"
        body="Nothing is lost. Try again in a moment."
        onRetry={() => void refetch()}
      />
    )
  }
  return (
    <View style={styles.frame}>
      <View>
        <Text size="lead" face="strong">
          {me.name}
        </Text>
        <Text tint="muted">{me.email}</Text>
      </View>
      <RoleLinks me={me} />
      <Card>
        <PlaceSetting place={me.place} />
      </Card>
      <Card>
        <Heading level={2} size="lead">
          Account
        </Heading>
        <Text tint="muted">Password, e-mail address, where you are signed in, units, light or dark.</Text>
        <ButtonLink kind="secondary" icon="me" href="/account" label="Open your account" />
      </Card>
      <MailSetting mail={me.mail} />
      <SecurityCard secondFactor={me.secondFactor} />
      <SignOut />
      <Link href="/tools">Calculators for water, fish and the way home</Link>
      <Link href="/about">What Tankward is, and how your money is held</Link>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
