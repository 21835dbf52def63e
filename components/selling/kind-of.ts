import type { Category } from '@/components/find/find-params'
import type { IconName } from '@/components/ui/icon-paths'
import type { OwnListing } from '@/shared/contracts/listings'

const kinds: readonly Category[] = ['fish', 'worms', 'media', 'produce']

/** What a listing is of, as its draft says; a draft that says nothing was begun before there was a choice: fish. */
export function kindOf({ draft }: Pick<OwnListing, 'draft'>): Category {
  return kinds.find((kind) => kind === draft.category) ?? 'fish'
}

/** From the address. undefined: not chosen yet. */
export const kindNamed = (text: string | undefined): Category | undefined =>
  kinds.find((kind) => kind === text)

export const kindTitles: Record<Category, string> = {
  fish: 'List a batch',
  worms: 'List worms',
  media: 'List media',
  produce: 'List produce',
}

export const kindIcons: Record<Category, IconName> = {
  fish: 'fish',
  worms: 'worm',
  media: 'media',
  produce: 'leaf',
}
