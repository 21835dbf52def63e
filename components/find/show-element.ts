/** Brings what has this id into view, without moving the keyboard there. */
export function showElement(id: string) {
  document.getElementById(id)?.scrollIntoView({ block: 'nearest' })
}
