import { cautionTexts, type CautionId } from '@/shared/domain/rules/caution-texts.facts'

type Placeholder<Text> = Text extends `${string}{${infer Name}}${infer Rest}`
  ? Name | Placeholder<Rest>
  : never

/** What a caution needs before it can be shown; {} when it stands as it is. */
export type CautionFacts<Id extends CautionId> = Record<Placeholder<(typeof cautionTexts)[Id]>, string>

/** The caution as a reader sees it. A missing fact is a compile error, so no brace ever reaches a screen. */
export function fillCaution<Id extends CautionId>(id: Id, facts: CautionFacts<Id>): string {
  const known: Record<string, string> = facts
  return cautionTexts[id].replace(/\{(\w+)\}/g, (whole, name: string) => known[name] ?? whole)
}
