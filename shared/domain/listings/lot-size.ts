/** A listing as far as the length of its animals goes. */
export type SizedLot =
  | { category: 'fish'; sizeLoMm: number; sizeHiMm: number }
  | { category: 'worms'; sizeLoMm?: number | undefined; sizeHiMm?: number | undefined }
  | { category: 'media' }
  | { category: 'produce' }

/** Shortest and longest animal, mm. null: not animals, or worms as they come. */
export function lotSize(lot: SizedLot): { loMm: number; hiMm: number } | null {
  if (lot.category !== 'fish' && lot.category !== 'worms') return null
  const { sizeLoMm: loMm, sizeHiMm: hiMm } = lot
  return loMm === undefined || hiMm === undefined ? null : { loMm, hiMm }
}
