/** Native lists have no ids to jump to; the alert beside the field is announced instead. */
export function focusElement(id: string) {
  return id.length > 0
}
