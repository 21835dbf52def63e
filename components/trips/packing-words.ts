import type { PackingClassId, SeasonOption } from '@/shared/domain/season/season-classes.facts'

export const packingWords: Record<PackingClassId, string> = {
  'carton-overnight': 'Plain carton, overnight',
  'foam-25-overnight': 'Foam box with 1 in walls, overnight',
  'foam-38-overnight': 'Foam box with 1 1/2 in walls, overnight',
  'carton-two-days': 'Plain carton, two days',
  'foam-25-two-days': 'Foam box with 1 in walls, two days',
  'foam-38-two-days': 'Foam box with 1 1/2 in walls, two days',
}

/** What goes into each box, and how warm the water is made. */
export const optionWords: Record<SeasonOption, string> = {
  'none-middle': 'no packs',
  'none-warm': 'no packs, water at the warm end of their range',
  'none-cool': 'no packs, water at the cool end of their range',
  'heat-2': 'two heat packs in each box',
  'heat-4': 'four heat packs in each box',
  'heat-4-warm': 'four heat packs in each box, water at the warm end of their range',
  'cold-2': 'two cold packs in each box',
  'cold-4': 'four cold packs in each box',
}
