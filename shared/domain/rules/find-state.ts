import { stateFacts, type UsState } from '@/shared/domain/rules/us-states.facts'

const byCode = new Map(stateFacts.map((state) => [state.code, state]))

/** null: not a two-letter code of a state or territory. */
export function findState(code: string): UsState | null {
  return byCode.get(code) ?? null
}
