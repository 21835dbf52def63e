/** A clock time of no particular zone: "9:00 AM" from "09:00". '' for what is no time. */
export function printWallTime(time: string): string {
  const at = new Date(`2026-01-01T${time}:00Z`)
  if (Number.isNaN(at.getTime())) return ''
  return at.toLocaleTimeString('en-US', { hour: 'numeric', minute: '2-digit', timeZone: 'UTC' })
}
