import { useFormState } from 'react-hook-form'

import { listErrors } from '@/components/forms/list-errors'
import { ButtonLink } from '@/components/ui/button-link'
import { ErrorSummary } from '@/components/ui/error-summary'

import type { SupplyTyping } from './supply-typing'
import type { PublishTrouble } from '@/components/forms/batch/use-publish'

interface Props {
  attempt: number
  trouble: PublishTrouble | null
}

/** After a try to publish: all that needs another look, each with a way to its field. */
export function SupplyErrors({ attempt, trouble }: Props) {
  const { errors } = useFormState<SupplyTyping>()
  if (attempt === 0) return null
  const named = listErrors(errors)
  return (
    <>
      <ErrorSummary errors={trouble ? [{ message: trouble.message }, ...named] : named} attempt={attempt} />
      {trouble?.needsPayouts ? (
        <ButtonLink href="/sell/payouts" kind="secondary" label="Set up payouts" />
      ) : null}
    </>
  )
}
