import { stepOfField, checkStep } from './batch-steps'

import type { BatchTyping } from './batch-typing'
import type { FieldPath } from 'react-hook-form'

export const batchLists = ['tiers', 'windows', 'photos'] as const

/** The form's name for a place the server points at: "#/tiers/1/unitCents". null: no field of this form. */
export function nameOfPointer(pointer: string): FieldPath<BatchTyping> | null {
  if (!pointer.startsWith('#/')) return null
  const steps = pointer.slice(2).split('/')
  const name = (steps[0] === 'draft' ? steps.slice(1) : steps).join('.')
  if (stepOfField(name) === checkStep) return null
  if (name.startsWith('statesServed')) return 'statesServed' // one control answers for all the states
  if (name.startsWith('shipping.days')) return 'shipping.days'
  const isList = batchLists.some((list) => list === name)
  return (isList ? `${name}.root` : name) as FieldPath<BatchTyping>
}
