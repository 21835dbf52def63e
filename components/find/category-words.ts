import type { Category } from './find-params'

export const categoryNames: Record<Category, string> = {
  fish: 'Fish',
  worms: 'Worms',
  media: 'Media',
  produce: 'Greens',
}

/** 'nile_tilapia' → 'Nile tilapia'. */
export function speciesWords(speciesId: string): string {
  const words = speciesId.replaceAll('_', ' ')
  return words.charAt(0).toUpperCase() + words.slice(1)
}
