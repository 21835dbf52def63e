import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'
import type { SourceKey } from '@/shared/sources'

/** Maryland's words for it; other states draw similar lines. */
export const produceFormSources: readonly SourceKey[] = ['umd-produce', 'food-code-2009']

/** How it is sold. Leaves cut from the plant at the harvest are still whole; what is done to them afterwards counts. */
export const produceForms = ['whole', 'harvest-cut', 'cut-mixed-or-washed'] as const
export type ProduceForm = (typeof produceForms)[number]

export interface FormJudgement {
  /** `held`: not shown until a moderator has accepted the paper. */
  effect: 'allowed' | 'allowed-with-label' | 'held'
  /** What must stand on bag or label. */
  label: string | null
  /** Why it is held. */
  saying: string | null
}

/** What the form of a harvest asks for. Nothing here frees anybody from selling safe food. */
export function judgeForm(form: ProduceForm, hasAcceptedLicence: boolean): FormJudgement {
  if (form === 'whole') return { effect: 'allowed', label: null, saying: null }
  if (form === 'harvest-cut')
    return { effect: 'allowed-with-label', label: 'Wash before eating.', saying: null }
  if (hasAcceptedLicence) {
    return { effect: 'allowed-with-label', label: 'Keep at 41 °F (5 °C) or colder.', saying: null }
  }
  return {
    effect: 'held',
    label: null,
    saying:
      'Cut, mixed or ready-to-eat greens need a food licence in most states. Add yours and we look at it, or sell whole leaves as they were harvested. Your state office says what it asks for.',
  }
}

/** What every buyer of raw produce reads. */
export const produceCaution = cautionTexts['G-9']
