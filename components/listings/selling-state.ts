import type { Tone } from '@/constants/theme'
import type { ShownListing } from '@/shared/contracts/listings'

export interface Refusal {
  tone: Extract<Tone, 'info' | 'caution' | 'danger'>
  title: string
  words: string
}

const states: Record<Exclude<ShownListing['state'], 'live'>, Refusal> = {
  draft: { tone: 'info', title: 'Not published yet', words: 'Only you can see this.' },
  pending_review: {
    tone: 'info',
    title: 'Waiting for a moderator',
    words: 'It can be found once it is approved.',
  },
  paused: {
    tone: 'caution',
    title: 'Paused by the grower',
    words: 'Nothing can be held from it now. Orders already made go on.',
  },
  sold_out: { tone: 'caution', title: 'Sold out', words: 'All of this batch is spoken for.' },
  expired: { tone: 'caution', title: 'This listing is over', words: 'Its last pickup window has passed.' },
  taken_down: { tone: 'danger', title: 'Taken down', words: 'Our moderators have taken this listing down.' },
}

/** Why nothing can be held from this listing now. null: something can. */
export function whyNotHeld(listing: ShownListing): Refusal | null {
  const { may, state, gate, free, body } = listing
  if (may.includes('edit')) {
    return { tone: 'info', title: 'This is your own listing', words: 'This is how others see it.' }
  }
  if (state !== 'live') return states[state]
  if (gate?.buy === 'no') {
    return {
      tone: 'danger',
      title: `Not for sale to a buyer in ${gate.buyerState}`,
      words: 'The facts are here for you to read. What we found, and where, stands below.',
    }
  }
  if (gate?.buy === 'ask-moderators') {
    return {
      tone: 'caution',
      title: 'Ask the moderators',
      words: `Nobody has checked this species for ${gate.buyerState} for us, and the animals would cross a state line. Until somebody has found a rule with a source, they cannot be sold to you here.`,
    }
  }
  if (free < body.minOrder) return states.sold_out
  if (may.includes('reserve')) return null
  return {
    tone: 'caution',
    title: 'Not to be held now',
    words: 'The grower is not taking orders from this listing at the moment.',
  }
}
