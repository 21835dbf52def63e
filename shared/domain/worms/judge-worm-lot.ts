import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'
import { findBlock } from '@/shared/domain/rules/find-block'
import { scanForTaxa } from '@/shared/domain/species/match-taxon'
import { traceLineage } from '@/shared/domain/species/trace-lineage'
import { findWormKind } from '@/shared/domain/worms/find-worm-kind'
import type { SourceKey } from '@/shared/sources'

export const wormLotSources: readonly SourceKey[] = ['mn-worms-2024', 'house-rule']

interface WormLot {
  taxonId: string
  /** What the seller calls them: strain and the like. */
  names: string
  /** Free words and captions. */
  words: string
  raisedInUs: boolean
  lotChecked: boolean
}

export interface WormReason {
  code: 'not-a-worm' | 'blocked' | 'not-checked' | 'not-raised-in-us' | 'words-name-blocked'
  field: 'taxonId' | 'strain' | 'lotChecked' | 'raisedInUs' | 'words'
  saying: string
}

export interface WormLotJudgement {
  /** `review`: an admin reads it first. */
  effect: 'fine' | 'review' | 'refuse'
  reasons: WormReason[]
}

const isBlocked = (taxonId: string) => {
  const lineage = traceLineage(taxonId)
  return lineage !== null && findBlock(lineage) !== null
}
const namesBlocked = (text: string) => scanForTaxa(text).some((match) => isBlocked(match.taxonId))

function refusals({ taxonId, names, lotChecked }: WormLot): WormReason[] {
  const found: WormReason[] = []
  if (isBlocked(taxonId)) found.push({ code: 'blocked', field: 'taxonId', saying: cautionTexts['G-4'] })
  else if (!findWormKind(taxonId)) {
    found.push({
      code: 'not-a-worm',
      field: 'taxonId',
      saying: 'Pick the worm from the list, genus and species.',
    })
  }
  if (namesBlocked(names)) found.push({ code: 'blocked', field: 'strain', saying: cautionTexts['G-4'] })
  if (!lotChecked) {
    found.push({
      code: 'not-checked',
      field: 'lotChecked',
      saying:
        'Look through the lot for jumping worms, also called snake worms or Alabama jumpers, then tick this.',
    })
  }
  return found
}

/**
 * A lot of worms. A name of a jumping worm where the animal is named refuses it; in free words it is read by a
 * person, for honest sellers write that they looked for them.
 */
export function judgeWormLot(lot: WormLot): WormLotJudgement {
  const refused = refusals(lot)
  const review: WormReason[] = []
  if (!lot.raisedInUs) {
    review.push({
      code: 'not-raised-in-us',
      field: 'raisedInUs',
      saying:
        'Worms from abroad need a federal import permit. We look at the papers before the listing is shown.',
    })
  }
  if (namesBlocked(lot.words)) {
    review.push({
      code: 'words-name-blocked',
      field: 'words',
      saying: 'The words name an animal we do not list. A moderator reads them before the listing is shown.',
    })
  }
  const effect = refused.length > 0 ? 'refuse' : review.length > 0 ? 'review' : 'fine'
  return { effect, reasons: [...refused, ...review] }
}
