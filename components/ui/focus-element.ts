/** Moves the keyboard to the control of this id and brings it into view. */
export function focusElement(id: string) {
  const element = document.getElementById(id)
  element?.focus()
  element?.scrollIntoView({ block: 'center' })
}
