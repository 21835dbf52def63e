import { useFormState } from 'react-hook-form'

import { stepOfField } from './batch-steps'

import { listErrors, type NamedError } from '@/components/forms/list-errors'

import type { BatchTyping } from './batch-typing'

/** Every error of the batch, in the order in which the questions are asked. */
export function useNamedErrors(): NamedError[] {
  const { errors } = useFormState<BatchTyping>()
  return listErrors(errors).toSorted((a, b) => stepOfField(a.name) - stepOfField(b.name))
}
