import { useEffect, useRef, useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from './account-form'
import { emailFault } from './account-checks'
import { refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

export function AskResetForm() {
  const askReset = useAuthAct('askReset')
  const [askedFor, setAskedFor] = useState('')
  const { values, field, refuse, summary, attempt } = useTypedForm({ email: '' })

  async function send() {
    const email = values.email.trim()
    if (refuse({ email: emailFault(email) })) return
    try {
      await askReset.mutateAsync({ email, redirectTo: '/reset-password' })
      setAskedFor(email)
    } catch (error) {
      refuse({ form: refusalWords(error) })
    }
  }

  if (askedFor) return <Asked email={askedFor} />
  return (
    <AccountForm
      label="Choose a new password"
      errors={summary}
      attempt={attempt}
      actLabel="Send me a link"
      busyLabel="Sending"
      isBusy={askReset.isPending}
      onSend={() => void send()}
    >
      <Field
        {...field('email')}
        label="E-mail address"
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
        spellCheck={false}
        enterKeyHint="send"
        onSubmitEditing={() => void send()}
      />
    </AccountForm>
  )
}

function Asked({ email }: { email: string }) {
  const box = useRef<View>(null)
  useEffect(() => box.current?.focus(), [])
  return (
    <View style={styles.frame}>
      <View ref={box} tabIndex={-1}>
        <Heading level={2}>Look into your mailbox</Heading>
      </View>
      <Text>
        If <Text face="strong">{email}</Text> has an account here, a mail with a link is on its way. The link
        works once, for ten minutes.
      </Text>
      <Link href="/sign-in">Back to sign in</Link>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg, maxWidth: 560 } })
