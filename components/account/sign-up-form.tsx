import type { Href } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from './account-form'
import { emailFault, newPasswordFault } from './account-checks'
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

const passwordCodes = ['PASSWORD_TOO_COMMON', 'PASSWORD_TOO_SHORT', 'PASSWORD_TOO_LONG']

export function SignUpForm({ returnTo }: Props) {
  const signUp = useAuthAct('signUp')
  const [mailedTo, setMailedTo] = useState('')
  const { values, field, refuse, summary, attempt } = useTypedForm({ name: '', email: '', password: '' })

  async function send() {
    const name = values.name.trim()
    const email = values.email.trim()
    const found = {
      name: name === '' ? 'Please give a name: growers greet you with it.' : undefined,
      email: emailFault(email),
      password: newPasswordFault(values.password),
    }
    if (refuse(found)) return
    const callbackURL = `/verify-email?returnTo=${encodeURIComponent(String(returnTo))}`
    try {
      await signUp.mutateAsync({ name, email, password: values.password, callbackURL })
      setMailedTo(email)
    } catch (error) {
      const code = refusalCode(error)
      if (code.startsWith('USER_ALREADY_EXISTS')) setMailedTo(email)
      else if (passwordCodes.includes(code)) refuse({ password: refusalWords(error) })
      else if (code === 'INVALID_EMAIL') refuse({ email: refusalWords(error) })
      else refuse({ form: refusalWords(error) })
    }
  }

  if (mailedTo) return <MailboxNotice email={mailedTo} why="signed-up" />
  return (
    <View style={styles.frame}>
      <AccountForm
        label="Make an account"
        errors={summary}
        attempt={attempt}
        actLabel="Make my account"
        busyLabel="Making your account"
        isBusy={signUp.isPending}
        onSend={() => void send()}
      >
        <Field
          {...field('name')}
          label="Your name"
          hint="The person you buy from or sell to sees it."
          autoComplete="name"
          maxLength={80}
          enterKeyHint="next"
        />
        <Field
          {...field('email')}
          label="E-mail address"
          hint="We send a link to it. No one else sees it."
          inputMode="email"
          autoComplete="email"
          autoCapitalize="none"
          spellCheck={false}
          enterKeyHint="next"
        />
        <PasswordField {...field('password')} label="Password" isNew onSubmit={() => void send()} />
      </AccountForm>
      <Text tint="muted">
        Have an account?{' '}
        <Link href={{ pathname: '/sign-in', params: { returnTo: String(returnTo) } }}>Sign in</Link>
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
