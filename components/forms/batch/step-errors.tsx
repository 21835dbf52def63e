import { stepOfField } from './batch-steps'
import { useNamedErrors } from './use-named-errors'

import { ErrorSummary } from '@/components/ui/error-summary'

interface Props {
  step: number
  /** How often "next" was refused on this step. */
  tries: number
}

export function StepErrors({ step, tries }: Props) {
  const errors = useNamedErrors().filter((error) => stepOfField(error.name) === step)
  return tries > 0 ? <ErrorSummary errors={errors} attempt={tries} /> : null
}
