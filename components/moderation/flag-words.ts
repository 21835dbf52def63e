import { fieldWords } from './field-words'

import type { TagBadge } from '@/components/listings/tag-facts'
import { findTaxon } from '@/shared/domain/species/find-taxon'

type Words = (about: string) => TagBadge

const taxonName = (id: string) => findTaxon(id)?.commonName ?? id
const contacts: Record<string, string> = {
  phone: 'a phone number',
  mail: 'a mail address',
  link: 'a link',
  street: 'a street address',
  handle: 'a way around the site',
}

const flags: Record<string, Words> = {
  'names-blocked': (id) => ({
    word: `Names a species we do not list: ${taxonName(id)}`,
    tone: 'danger',
    icon: 'stop',
  }),
  'names-other': (id) => ({
    word: `Names another species: ${taxonName(id)}`,
    tone: 'caution',
    icon: 'question',
  }),
  contact: (kind) => ({ word: `Text holds ${contacts[kind] ?? kind}`, tone: 'caution', icon: 'message' }),
  'photo-of-another': () => ({ word: 'Photo looks like another seller’s', tone: 'danger', icon: 'camera' }),
  'photo-used-before': () => ({ word: 'Photo used in an earlier listing', tone: 'caution', icon: 'camera' }),
  'photo-date-differs': () => ({
    word: 'Photo date differs from the camera’s',
    tone: 'caution',
    icon: 'camera',
  }),
  'first-listing': () => ({ word: 'First listing of this seller', tone: 'info', icon: 'star' }),
  'removed-before': () => ({ word: 'Had a listing removed before', tone: 'danger', icon: 'flag' }),
  'law-unknown': () => ({ word: 'Law not checked here', tone: 'caution', icon: 'scale' }),
  'licence-unsure': () => ({ word: 'Seller unsure about the licence', tone: 'caution', icon: 'scale' }),
  'protected-papers': () => ({ word: 'Protected: papers needed', tone: 'danger', icon: 'shield' }),
  new: () => ({ word: 'New listing', tone: 'neutral', icon: 'plus' }),
  'hides-for': (field) => ({
    word: `Changed, off sale: ${fieldWords(field)}`,
    tone: 'caution',
    icon: 'edit',
  }),
  edit: (field) => ({ word: `Changed: ${fieldWords(field)}`, tone: 'neutral', icon: 'edit' }),
}

/** A flag in words; one this version does not know is shown as it is, never dropped. */
export function flagWords(flag: string): TagBadge {
  const [name = '', ...about] = flag.split(':')
  const words = Object.hasOwn(flags, name) ? flags[name] : undefined
  return words ? words(about.join(':')) : { word: flag, tone: 'neutral', icon: 'flag' }
}
