import { StyleSheet, View } from 'react-native'
import { useState } from 'react'
import type { Href } from 'expo-router'

import { AccountForm } from './account-form'
import { emailFault } from './account-checks'
import { MailboxNotice } from './mailbox-notice'
import { refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { ErrorState } from '@/components/ui/error-state'
import { Field } from '@/components/ui/field'
import { SkeletonRows } from '@/components/ui/skeleton'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'
import { useMe } from '@/hooks/use-me'

interface Props {
  /** The code the link came back with, when it did not work. */
  fault: string | undefined
  returnTo: Href
}

/** Where the link of the confirming mail ends. */
export function EmailLanding({ fault, returnTo }: Props) {
  const { me, isPending, error, refetch } = useMe()
  if (fault) return <LinkTooOld />
  if (isPending) return <SkeletonRows label="Looking whether you are signed in" rows={1} />
  if (error) {
    return (
      <ErrorState
        title="We could not look up your account"
        body="Your address is confirmed all the same. Try again in a moment."
        onRetry={() => void refetch()}
      />
    )
  }
  return (
    <View style={styles.frame}>
      <Banner tone="safe" title="Your e-mail address is confirmed">
        {me ? 'You are signed in.' : 'Sign in and you can hold animals and pay deposits.'}
      </Banner>
      {me ? (
        <ButtonLink
          href={returnTo}
          label={returnTo === '/' ? 'Find growers near you' : 'Go on where you were'}
        />
      ) : (
        <ButtonLink href={{ pathname: '/sign-in', params: { returnTo: String(returnTo) } }} label="Sign in" />
      )}
    </View>
  )
}

function LinkTooOld() {
  const resend = useAuthAct('resendVerification')
  const [mailedTo, setMailedTo] = useState('')
  const { values, field, refuse, summary, attempt } = useTypedForm({ email: '' })

  async function send() {
    const email = values.email.trim()
    if (refuse({ email: emailFault(email) })) return
    try {
      await resend.mutateAsync({ email, callbackURL: '/verify-email' })
      setMailedTo(email)
    } catch (error) {
      refuse({ form: refusalWords(error) })
    }
  }

  if (mailedTo) return <MailboxNotice email={mailedTo} why="signed-up" />
  return (
    <View style={styles.frame}>
      <Banner tone="caution" title="That link does not work any more">
        Links work once and for one hour. Give your address and we send a fresh one.
      </Banner>
      <AccountForm
        label="Send a fresh link"
        errors={summary}
        attempt={attempt}
        actLabel="Send a fresh link"
        busyLabel="Sending"
        isBusy={resend.isPending}
        onSend={() => void send()}
      >
        <Field
          {...field('email')}
          label="E-mail address"
          inputMode="email"
          autoComplete="email"
          autoCapitalize="none"
          spellCheck={false}
          onSubmitEditing={() => void send()}
        />
      </AccountForm>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg, maxWidth: 560 } })
