import { useId, useState } from 'react'

import type { FormError } from '@/components/ui/error-summary'

type Errors<Name extends string> = Partial<Record<Name | 'form', string>>

/** A small form of text fields: what was typed, what is wrong with it, and how often it was sent. */
export function useTypedForm<Name extends string>(first: Record<Name, string>) {
  const id = useId()
  const [values, setValues] = useState(first)
  const [errors, setErrors] = useState<Errors<Name>>({})
  const [attempt, setAttempt] = useState(0)
  const names = Object.keys(first) as Name[]

  const field = (name: Name) => ({
    fieldId: `${id}-${name}`,
    value: values[name],
    error: errors[name],
    onChangeText: (text: string) => {
      setValues((before) => ({ ...before, [name]: text }))
      setErrors((before) => ({ ...before, [name]: undefined, form: undefined }))
    },
  })
  /** Shows what is wrong; true when something was. */
  function refuse(found: Errors<Name>): boolean {
    setErrors(found)
    const isRefused = Object.values(found).some(Boolean)
    if (isRefused) setAttempt((before) => before + 1)
    return isRefused
  }
  /** Empties the fields after the act: passwords do not stay on the screen. */
  const clear = () => setValues(first)
  const summary: FormError[] = names.flatMap((name) => {
    const message = errors[name]
    return message ? [{ fieldId: `${id}-${name}`, message }] : []
  })
  if (errors.form) summary.push({ message: errors.form })
  return { values, field, refuse, summary, attempt, clear }
}
