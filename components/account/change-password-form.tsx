import { useState } from 'react'
import { StyleSheet } from 'react-native'

import { AccountForm } from './account-form'
import { newPasswordFault } from './account-checks'
import { PasswordField } from './password-field'
import { refusalCode, refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

/** Under which field a refusal belongs. */
function placeOf(error: unknown): 'current' | 'fresh' | 'form' {
  const code = refusalCode(error)
  if (code === 'INVALID_PASSWORD') return 'current'
  return code.startsWith('PASSWORD_') ? 'fresh' : 'form'
}

export function ChangePasswordForm() {
  const change = useAuthAct('changePassword')
  const [isDone, setDone] = useState(false)
  const { values, field, refuse, summary, attempt, clear } = useTypedForm({ current: '', fresh: '' })

  async function send() {
    const missing = values.current === '' ? 'Please give your current password.' : undefined
    if (refuse({ current: missing, fresh: newPasswordFault(values.fresh) })) return
    try {
      await change.mutateAsync({
        currentPassword: values.current,
        newPassword: values.fresh,
        revokeOtherSessions: true,
      })
      setDone(true)
      clear()
    } catch (error) {
      setDone(false)
      refuse({ [placeOf(error)]: refusalWords(error) })
    }
  }

  return (
    <Card labelledBy="account-password" style={styles.card}>
      <Heading level={2} size="lead" nativeID="account-password">
        Password
      </Heading>
      {isDone ? (
        <Banner isLive tone="safe" title="Your password is changed">
          Every other device is signed out. This one stays.
        </Banner>
      ) : (
        <Text tint="muted">A new password signs out every other device.</Text>
      )}
      <AccountForm
        label="Change the password"
        errors={summary}
        attempt={attempt}
        actLabel="Change my password"
        busyLabel="Changing"
        isBusy={change.isPending}
        onSend={() => void send()}
      >
        <PasswordField {...field('current')} label="Current password" onSubmit={() => void send()} />
        <PasswordField {...field('fresh')} label="New password" isNew onSubmit={() => void send()} />
      </AccountForm>
    </Card>
  )
}

const styles = StyleSheet.create({ card: { gap: space.lg } })
