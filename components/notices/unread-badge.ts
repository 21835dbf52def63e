/** What stands on the bell: nothing for none, and never more than two digits. */
export function unreadBadge(unread: number | null): string {
  if (!unread) return ''
  return unread > 99 ? '99+' : String(unread)
}
