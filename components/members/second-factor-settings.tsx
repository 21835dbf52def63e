import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { BackupCodes } from './backup-codes'
import { FirstCode, type Enrolment } from './first-code'
import { PasswordStep } from './password-step'

import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'
import { useMe } from '@/hooks/use-me'

/** Switching the second factor on (password, scan, first code, backup codes) and off (password). */
export function SecondFactorSettings() {
  const { me, error, refetch } = useMe()
  const start = useAuthAct('startSecondFactor')
  const stop = useAuthAct('stopSecondFactor')
  const [enrolment, setEnrolment] = useState<Enrolment | null>(null)
  const [isProven, setIsProven] = useState(false)

  if (enrolment && isProven) return <BackupCodes codes={enrolment.backupCodes} />
  if (enrolment) return <FirstCode enrolment={enrolment} onProven={() => setIsProven(true)} />
  if (me === null) {
    const href = { pathname: '/sign-in', params: { returnTo: '/me/second-factor' } } as const
    return <ButtonLink href={href} label="Sign in first" />
  }
  if (!me) {
    if (!error) return <SkeletonRows label="Loading your account" rows={1} />
    return (
      <ErrorState
        title="We could not load your account"
        body="Nothing has changed. Try again in a moment."
        onRetry={() => void refetch()}
      />
    )
  }
  const { enabled, required } = me.secondFactor
  if (!enabled) {
    return (
      <View style={styles.frame}>
        {required ? (
          <Banner tone="caution" title="Your account needs it">
            Moderators and admins work with other people’s papers and money. The moderation desk opens once
            this is set up.
          </Banner>
        ) : null}
        <Text>
          You need an app that makes sign-in codes, on your phone or in your password manager. It takes about
          two minutes.
        </Text>
        <PasswordStep
          label="Set up a second factor"
          actLabel="Go on"
          isBusy={start.isPending}
          onPassword={async (password) => setEnrolment(await start.mutateAsync({ password }))}
        />
      </View>
    )
  }
  return (
    <View style={styles.frame}>
      <Banner tone="safe" icon="shield" title="Your second factor is on">
        {required
          ? 'It cannot be switched off while you are a moderator or an admin.'
          : 'Signing in asks for a code from your app. Switching it off needs your password.'}
      </Banner>
      {required ? null : (
        <PasswordStep
          label="Switch off the second factor"
          actLabel="Switch it off"
          isBusy={stop.isPending}
          onPassword={async (password) => void (await stop.mutateAsync({ password }))}
        />
      )}
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
