const minuteMs = 60_000
const hourMs = 60 * minuteMs
const dayMs = 24 * hourMs

/** How long something waits: "just now", "25 min", "3 h", "2 days". */
export function ageWords(sinceMs: number, nowMs: number): string {
  const age = nowMs - sinceMs
  if (age < 2 * minuteMs) return 'just now'
  if (age < hourMs) return `${Math.floor(age / minuteMs)} min`
  if (age < 2 * dayMs) return `${Math.floor(age / hourMs)} h`
  return `${Math.floor(age / dayMs)} days`
}
