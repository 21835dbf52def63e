import { categories, type Category } from '@/components/find/find-params'
import type { OwnListing } from '@/shared/contracts/listings'

/** What a listing is of, as its draft says; a draft that says nothing was begun before there was a choice: fish. */
export function kindOf({ draft }: Pick<OwnListing, 'draft'>): Category {
  return categories.find((kind) => kind === draft.category) ?? 'fish'
}

/** From the address. undefined: not chosen yet. */
export const kindNamed = (text: string | undefined): Category | undefined =>
  categories.find((kind) => kind === text)

export const kindTitles: Record<Category, string> = {
  fish: 'List a batch',
  worms: 'List worms',
  media: 'List media',
  produce: 'List produce',
}
