import type { FieldPathByValue, UseFormReturn } from 'react-hook-form'

import type { BatchTyping } from './batch-typing'

type TextName = FieldPathByValue<BatchTyping, string>

/** Checks fields that depend on the one just left, but only those already answered: nobody is scolded in advance. */
export function checkAgain(form: UseFormReturn<BatchTyping>, names: readonly TextName[]) {
  const answered = names.filter((name) => form.getValues(name) !== '')
  if (answered.length > 0) void form.trigger(answered)
}
