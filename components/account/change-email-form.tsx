import { useState } from 'react'
import { StyleSheet } from 'react-native'

import { AccountForm } from './account-form'
import { emailFault } from './account-checks'
import { PasswordField } from './password-field'
import { refusalCode, refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

/** Another address takes effect with the link mailed to it; the words are the same for one that is taken. */
export function ChangeEmailForm({ email }: { email: string }) {
  const change = useAuthAct('changeEmail')
  const [mailedTo, setMailedTo] = useState('')
  const { values, field, refuse, summary, attempt, clear } = useTypedForm({ email: '', password: '' })

  async function send() {
    const newEmail = values.email.trim()
    const isSame = newEmail.toLowerCase() === email.toLowerCase()
    const fault = emailFault(newEmail) ?? (isSame ? 'That is your address already.' : undefined)
    const missing = values.password === '' ? 'Please give your current password.' : undefined
    if (refuse({ email: fault, password: missing })) return
    try {
      const callbackURL = '/verify-email?returnTo=/account'
      await change.mutateAsync({ newEmail, currentPassword: values.password, callbackURL })
      setMailedTo(newEmail)
      clear()
    } catch (error) {
      refuse({ [refusalCode(error) === 'INVALID_PASSWORD' ? 'password' : 'form']: refusalWords(error) })
    }
  }

  return (
    <Card labelledBy="account-email" style={styles.card}>
      <Heading level={2} size="lead" nativeID="account-email">
        E-mail address
      </Heading>
      <Text>
        Now: <Text face="strong">{email}</Text>
      </Text>
      {mailedTo ? (
        <Banner isLive tone="info" icon="mail" title="Look into your new mailbox">
          {`We wrote to ${mailedTo}. Your address changes when you open the link there; it works for one hour. Until then you sign in with the old one.`}
        </Banner>
      ) : null}
      <AccountForm
        label="Change the e-mail address"
        errors={summary}
        attempt={attempt}
        actLabel="Mail me the link"
        busyLabel="Sending"
        isBusy={change.isPending}
        onSend={() => void send()}
      >
        <Field
          {...field('email')}
          label="New e-mail address"
          inputMode="email"
          autoComplete="email"
          autoCapitalize="none"
          spellCheck={false}
          enterKeyHint="next"
          onSubmitEditing={() => void send()}
        />
        <PasswordField {...field('password')} label="Current password" onSubmit={() => void send()} />
      </AccountForm>
    </Card>
  )
}

const styles = StyleSheet.create({ card: { gap: space.lg } })
