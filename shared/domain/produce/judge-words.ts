import { newestThreshold } from '@/shared/domain/produce/farm-thresholds.facts'
import type { ProduceForm } from '@/shared/domain/produce/judge-form'
import { findBlock, findGuard } from '@/shared/domain/rules/find-block'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { scanForTaxa } from '@/shared/domain/species/match-taxon'
import { traceLineage } from '@/shared/domain/species/trace-lineage'
import type { SourceKey } from '@/shared/sources'

/** All from memory: the organic programme, seafood rules and the part about sprouts were not read. */
export const produceWordSources: readonly SourceKey[] = ['memory', 'house-rule']

export type OrganicClaim = 'certified' | 'exempt-small'

export interface WordFinding {
  rule: 'organic' | 'ready-to-eat' | 'sprouts' | 'dead-fish' | 'watched-plant'
  word: string
  /** `stop`: cannot be saved like this. `hold`: a moderator reads it first. */
  effect: 'stop' | 'hold'
  saying: string
}

interface Declared {
  organic: OrganicClaim | null
  form: ProduceForm
  /** The plant that was picked, when the species gate watches it already. */
  taxonId: string | null
}

/** Whole words in any case; 'not organic', 'non-organic' and 'not sprouts' claim nothing. */
const whole = (words: string) =>
  new RegExp(
    `(?<![\\p{L}\\p{N}])(?<!(?<![\\p{L}\\p{N}])(?:not|no|non)[\\s-]+)(?:${words})(?![\\p{L}\\p{N}])`,
    'iu',
  )

const signs = {
  organic: whole('organic|organics|organically'),
  'ready-to-eat': whole('ready[\\s-]+to[\\s-]+eat|rte'),
  sprouts: whole('(?<!brussels?[\\s-]+)(?:sprouts?|sprouted)'),
  'dead-fish': whole('fillets?|filleted|filets?|dressed|smoked'),
} as const

const organicSaying = () =>
  `"Organic" is a word the law keeps. Say whether you are certified, or exempt with at most $${newestThreshold('organic-exempt').dollars.toLocaleString('en-US')} a year; otherwise leave it out. You may say how you grow, for instance "grown without synthetic pesticides".`

/** What the words of a produce listing claim that its answers do not carry. */
export function judgeWords(text: string, { organic, form, taxonId }: Declared): WordFinding[] {
  const read = text.normalize('NFKC').replace(/\p{Cf}/gu, '')
  const found: WordFinding[] = []
  const look = (rule: keyof typeof signs, effect: 'stop' | 'hold', saying: string) => {
    const word = signs[rule].exec(read)?.[0]
    if (word !== undefined) found.push({ rule, word, effect, saying })
  }
  if (organic === null) look('organic', 'stop', organicSaying())
  if (form !== 'cut-mixed-or-washed') {
    look(
      'ready-to-eat',
      'stop',
      '"Ready to eat" means washed and packed under a food licence. Choose that form, or leave the words out.',
    )
  }
  look(
    'sprouts',
    'stop',
    'Sprouts are not sold here: they have a strict rule of their own. Microgreens are fine.',
  )
  look(
    'dead-fish',
    'hold',
    'Fish as food is not sold here. If you mean something else, a moderator lets it through.',
  )
  return [...found, ...watchedPlants(read, taxonId)]
}

/** Plants a text names that we never list, or only with a permit. Names of fish are not looked for: 'rainbow chard'. */
function watchedPlants(text: string, pickedId: string | null): WordFinding[] {
  return scanForTaxa(text).flatMap(({ taxonId }) => {
    const lineage = traceLineage(taxonId)
    if (!lineage || lineage.kind !== 'plant' || taxonId === pickedId) return []
    if (!findBlock(lineage) && !findGuard(lineage)) return []
    const word = findTaxon(taxonId)?.commonName ?? taxonId
    return [
      {
        rule: 'watched-plant',
        word,
        effect: 'hold',
        saying: `${word} is a plant we watch. If you sell it, pick it as the crop; otherwise leave the name out.`,
      },
    ]
  })
}
