import { changedFields, flattenBody, type BodyFields } from '@/shared/domain/listings/flatten-body'
import { effectOfField } from '@/shared/domain/listings/material-edit'
import { printAnswer } from '@/shared/domain/listings/print-answer'

export interface BodyChange {
  field: string
  before: string
  after: string
  /** True: this change alone takes a listing off sale until a moderator has looked. */
  material: boolean
}

/** What differs between two versions, in words; changes that hide a listing stand first. */
export function compareBodies(before: BodyFields, after: BodyFields): BodyChange[] {
  const was = flattenBody(before)
  const is = flattenBody(after)
  const changes = changedFields(before, after).map((field) => ({
    field,
    before: printAnswer(field, was.get(field)),
    after: printAnswer(field, is.get(field)),
    material: effectOfField(field, before, after) === 'hide',
  }))
  return [...changes.filter((change) => change.material), ...changes.filter((change) => !change.material)]
}
