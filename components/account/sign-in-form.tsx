import { useRouter, type Href } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from './account-form'
import { emailFault } from './account-checks'
import { MailboxNotice } from './mailbox-notice'
import { PasswordField } from './password-field'
import { refusalCode, refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Field } from '@/components/ui/field'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

interface Props {
  returnTo: Href
}

export function SignInForm({ returnTo }: Props) {
  const router = useRouter()
  const signIn = useAuthAct('signIn')
  const [unconfirmed, setUnconfirmed] = useState('')
  const { values, field, refuse, summary, attempt } = useTypedForm({ email: '', password: '' })

  async function send() {
    const missing = values.password === '' ? 'Please give your password.' : undefined
    if (refuse({ email: emailFault(values.email), password: missing })) return
    try {
      const reply = await signIn.mutateAsync({
        email: values.email.trim(),
        password: values.password,
        // Where the link of a confirming mail ends, should the address not be confirmed yet.
        callbackURL: '/verify-email',
      })
      const next = { pathname: '/second-factor', params: { returnTo: String(returnTo) } } as const
      router.replace(reply.twoFactorRedirect ? next : returnTo)
    } catch (error) {
      if (refusalCode(error) === 'EMAIL_NOT_VERIFIED') setUnconfirmed(values.email.trim())
      else refuse({ form: refusalWords(error) })
    }
  }

  if (unconfirmed) return <MailboxNotice email={unconfirmed} why="not-confirmed" />
  return (
    <View style={styles.frame}>
      <AccountForm
        label="Sign in"
        errors={summary}
        attempt={attempt}
        actLabel="Sign in"
        busyLabel="Signing in"
        isBusy={signIn.isPending}
        onSend={() => void send()}
      >
        <Field
          {...field('email')}
          label="E-mail address"
          inputMode="email"
          autoComplete="email"
          autoCapitalize="none"
          spellCheck={false}
          enterKeyHint="next"
          onSubmitEditing={() => void send()}
        />
        <PasswordField {...field('password')} label="Password" onSubmit={() => void send()} />
      </AccountForm>
      <Link href="/forgot-password">I forgot my password</Link>
      <Text tint="muted">
        New here?{' '}
        <Link href={{ pathname: '/sign-up', params: { returnTo: String(returnTo) } }}>Make an account</Link>
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
