import { useFormState } from 'react-hook-form'

import { listErrors } from '@/components/forms/list-errors'
import { ErrorSummary } from '@/components/ui/error-summary'

import type { FarmTyping } from './farm-typing'

interface Props {
  attempt: number
  /** What stopped the saving as a whole. */
  trouble: string
}

export function FarmErrors({ attempt, trouble }: Props) {
  const { errors } = useFormState<FarmTyping>()
  if (attempt === 0) return null
  return (
    <ErrorSummary
      errors={[...(trouble ? [{ message: trouble }] : []), ...listErrors(errors)]}
      attempt={attempt}
    />
  )
}
