import { judgeForm } from '@/shared/domain/produce/judge-form'
import { findTaxon } from '@/shared/domain/species/find-taxon'

/**
 * Why a listing of media or produce is not shown before a moderator has looked, by the part of a flag before its
 * colon. Every other flag is for the moderator's eyes only and holds nothing back.
 */
const holds: Record<string, (about: string) => string> = {
  'form-needs-licence': () => judgeForm('cut-mixed-or-washed', false).saying ?? '',
  'permit-plant': (id) =>
    `${findTaxon(id)?.commonName ?? 'This plant'} is on the federal list of noxious weeds: it is sold inside your state alone, with a permit, and never shipped. Write the number of your permit in your words; a moderator reads it.`,
  'words-hold': (word) => `A moderator reads your words first, because of "${word}".`,
  'names-blocked': () => 'The words name something we do not list. A moderator reads them first.',
  'not-raised-in-us': () =>
    'Worms from abroad need a federal import permit. We look at the papers before the listing is shown.',
  contact: () => 'The words seem to hold a way to reach you. A moderator reads them first.',
  'photo-of-another': () => 'The photo looks like one of another seller. A moderator looks at it first.',
  'removed-before': () => 'A listing of yours was taken down before, so a moderator looks at new ones first.',
}

/** Why this flag holds a listing back, for its seller. null: it does not. */
export function heldWords(flag: string): string | null {
  const [name = '', ...about] = flag.split(':')
  return Object.hasOwn(holds, name) ? (holds[name]?.(about.join(':')) ?? null) : null
}
