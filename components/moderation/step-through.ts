/** Moves the keyboard to the next or previous element whose id begins so; the first or last where none has it. */
export function stepThrough(idPrefix: string, by: 1 | -1) {
  const all = [...document.querySelectorAll<HTMLElement>(`[id^="${idPrefix}"]`)]
  const at = all.findIndex((element) => element === document.activeElement)
  const next = at === -1 ? (by === 1 ? 0 : all.length - 1) : Math.min(all.length - 1, Math.max(0, at + by))
  all[next]?.focus()
  all[next]?.scrollIntoView({ block: 'nearest' })
}
