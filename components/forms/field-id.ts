/** The element id of a field's control, so that an error summary can jump to it. */
export function fieldIdOf(name: string): string {
  return `field-${name.replaceAll('.', '-')}`
}
