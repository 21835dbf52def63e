import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from './account-form'
import { newPasswordFault } from './account-checks'
import { PasswordField } from './password-field'
import { refusalCode, refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

interface Props {
  /** From the link in the mail; absent when the link was too old. */
  token: string | undefined
}

export function ResetForm({ token }: Props) {
  const reset = useAuthAct('reset')
  const [outcome, setOutcome] = useState<'open' | 'done' | 'too-old'>(token ? 'open' : 'too-old')
  const { values, field, refuse, summary, attempt } = useTypedForm({ password: '' })

  async function send() {
    if (!token || refuse({ password: newPasswordFault(values.password) })) return
    try {
      await reset.mutateAsync({ newPassword: values.password, token })
      setOutcome('done')
    } catch (error) {
      const code = refusalCode(error)
      if (code === 'INVALID_TOKEN') setOutcome('too-old')
      else if (code.startsWith('PASSWORD_')) refuse({ password: refusalWords(error) })
      else refuse({ form: refusalWords(error) })
    }
  }

  if (outcome === 'done') {
    return (
      <View style={styles.frame}>
        <Banner isLive tone="safe" title="Your password is changed">
          You are signed out everywhere. Sign in with the new password.
        </Banner>
        <ButtonLink href="/sign-in" label="Sign in" />
      </View>
    )
  }
  if (outcome === 'too-old') {
    return (
      <View style={styles.frame}>
        <Banner isLive tone="caution" title="That link does not work any more">
          Links work once and for ten minutes. Your password is unchanged.
        </Banner>
        <ButtonLink href="/forgot-password" label="Ask for a fresh link" />
      </View>
    )
  }
  return (
    <AccountForm
      label="Choose a new password"
      errors={summary}
      attempt={attempt}
      actLabel="Change my password"
      busyLabel="Changing"
      isBusy={reset.isPending}
      onSend={() => void send()}
    >
      <PasswordField {...field('password')} label="New password" isNew onSubmit={() => void send()} />
    </AccountForm>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg, maxWidth: 560 } })
