import { useNamedErrors } from './use-named-errors'

import { ButtonLink } from '@/components/ui/button-link'
import { ErrorSummary } from '@/components/ui/error-summary'

import type { PublishTrouble } from './use-publish'

interface Props {
  attempt: number
  trouble: PublishTrouble | null
  onOpen?: (fieldId: string) => void
}

/** After a try to publish: all that needs another look, each with a way to its field. */
export function BatchErrors({ attempt, trouble, onOpen }: Props) {
  const errors = useNamedErrors()
  if (attempt === 0) return null
  const all = trouble ? [{ message: trouble.message }, ...errors] : errors
  return (
    <>
      <ErrorSummary errors={all} attempt={attempt} onOpen={onOpen} />
      {trouble?.needsPayouts ? (
        <ButtonLink href="/sell/payouts" kind="secondary" label="Set up payouts" />
      ) : null}
    </>
  )
}
