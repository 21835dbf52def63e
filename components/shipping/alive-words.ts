import { parseCount, printCount } from '@/shared/units/count'

/** What is wrong with a typed count of live animals; null: nothing. */
export function aliveError(typed: string, sent: number): string | null {
  const count = parseCount(typed)
  if (count === null) return 'How many are alive? A whole number; 0 is an answer.'
  return count > sent ? `Only ${printCount(sent)} were sent.` : null
}

export function aliveOutcome(alive: number, sent: number): string {
  return alive === sent
    ? 'All alive: the claim ends and the seller is paid.'
    : `${printCount(sent - alive)} lost: a moderator decides what goes back to you. The money stays held until then.`
}
