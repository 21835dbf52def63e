const prefix = 'field-'

/** The element id of a field's control, so that an error summary can jump to it. */
export function fieldIdOf(name: string): string {
  return prefix + name.replaceAll('.', '-')
}

/** The field's name again, with dots between its parts. */
export function nameOfFieldId(fieldId: string): string {
  return fieldId.slice(prefix.length).replaceAll('-', '.')
}
