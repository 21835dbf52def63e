import { AccountForm } from '@/components/account/account-form'
import { PasswordField } from '@/components/account/password-field'
import { refusalCode, refusalWords } from '@/components/account/refusal-words'
import { useTypedForm } from '@/components/account/use-typed-form'

interface Props {
  label: string
  actLabel: string
  isBusy: boolean
  onPassword: (password: string) => Promise<void>
}

export function PasswordStep({ label, actLabel, isBusy, onPassword }: Props) {
  const { values, field, refuse, summary, attempt } = useTypedForm({ password: '' })
  async function send() {
    if (refuse({ password: values.password === '' ? 'Please give your password.' : undefined })) return
    try {
      await onPassword(values.password)
    } catch (error) {
      refuse({ [refusalCode(error) === 'INVALID_PASSWORD' ? 'password' : 'form']: refusalWords(error) })
    }
  }
  return (
    <AccountForm
      label={label}
      errors={summary}
      attempt={attempt}
      actLabel={actLabel}
      busyLabel="Checking"
      isBusy={isBusy}
      onSend={() => void send()}
    >
      <PasswordField {...field('password')} label="Your password" onSubmit={() => void send()} />
    </AccountForm>
  )
}
