import { fieldIdOf } from './field-id'

import type { FormError } from '@/components/ui/error-summary'
import type { FieldErrors, FieldValues } from 'react-hook-form'

export interface NamedError extends FormError {
  name: string
}

/** Every message of a form's error tree, flat, in the order in which the fields were checked. */
export function listErrors<T extends FieldValues>(errors: FieldErrors<T>): NamedError[] {
  return walk(errors, [])
}

function walk(node: unknown, path: string[]): NamedError[] {
  if (typeof node !== 'object' || node === null) return []
  if ('message' in node && typeof node.message === 'string' && 'type' in node) {
    const name = path.filter((step) => step !== 'root').join('.')
    return [{ name, fieldId: fieldIdOf(name), message: node.message }]
  }
  return Object.entries(node).flatMap(([key, part]) => (key === 'ref' ? [] : walk(part, [...path, key])))
}
