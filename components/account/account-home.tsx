import { StyleSheet, View } from 'react-native'

import { ChangeEmailForm } from './change-email-form'
import { ChangePasswordForm } from './change-password-form'
import { SessionsCard } from './sessions-card'

import { NoConnection } from '@/components/listings/no-connection'
import { ThemeSetting } from '@/components/members/theme-setting'
import { UnitsSetting } from '@/components/members/units-setting'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { space } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import { useOnline } from '@/hooks/use-online'

/** How one signs in, and how figures and pages look. */
export function AccountHome() {
  const { me, error, refetch } = useMe()
  const isOnline = useOnline()
  if (me === null) {
    const href = { pathname: '/sign-in', params: { returnTo: '/account' } } as const
    return <ButtonLink href={href} label="Sign in first" />
  }
  if (!me) {
    if (!isOnline) return <NoConnection kept="Nothing is lost." onRetry={() => void refetch()} />
    if (!error) return <SkeletonRows label="Loading your account" rows={4} />
    return (
      <ErrorState
        title="We could not load your account"
        body="Nothing has changed. Try again in a moment."
        onRetry={() => void refetch()}
      />
    )
  }
  return (
    <View style={styles.frame}>
      <Card labelledBy="account-display">
        <Heading level={2} size="lead" nativeID="account-display">
          Units and look
        </Heading>
        <UnitsSetting units={me.units} />
        <ThemeSetting />
      </Card>
      <SessionsCard />
      <ChangePasswordForm />
      <ChangeEmailForm email={me.email} />
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
