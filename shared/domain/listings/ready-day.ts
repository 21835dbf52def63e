/** A listing as far as its first day goes. */
export type ReadiedLot =
  | { category: 'fish'; readyOn?: string | undefined }
  | { category: 'worms' | 'media' }
  | { category: 'produce'; harvest: { day: string } }

/** The day from which it can be had, YYYY-MM-DD. null: it is there now. */
export function readyDay(lot: ReadiedLot): string | null {
  if (lot.category === 'fish') return lot.readyOn ?? null
  return lot.category === 'produce' ? lot.harvest.day : null
}
