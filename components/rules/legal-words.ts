import type { IconName } from '@/components/ui/icon-paths'
import type { Tone } from '@/constants/theme'
import type { GateVerdict } from '@/shared/contracts/rules'

export interface LegalWords {
  word: string
  tone: Tone
  icon: IconName
}

type Known = GateVerdict['status']

const words: Record<Known, (state: string) => LegalWords> = {
  allowed: (state) => ({ word: `Allowed in ${state}`, tone: 'safe', icon: 'shield' }),
  allowed_with_conditions: (state) => ({ word: `Conditions in ${state}`, tone: 'info', icon: 'shield' }),
  permit_buyer: (state) => ({ word: `Your permit needed in ${state}`, tone: 'caution', icon: 'shield' }),
  permit_seller: () => ({ word: 'Seller’s permit needed', tone: 'info', icon: 'shield' }),
  permit_both: (state) => ({ word: `Permits needed in ${state}`, tone: 'caution', icon: 'shield' }),
  unknown: (state) => ({ word: `Nobody has checked ${state}`, tone: 'caution', icon: 'question' }),
  prohibited: (state) => ({ word: `Not for sale in ${state}`, tone: 'danger', icon: 'stop' }),
}

/** The legal status for a state in a few words; what is not one of ours reads as unknown. */
export function legalWords(status: string, state: string): LegalWords {
  return Object.hasOwn(words, status) ? words[status as Known](state) : words.unknown(state)
}
