/** A listing as far as the states of its buyers go. */
export type ServingLot =
  { category: 'fish' | 'worms'; statesServed: readonly string[] } | { category: 'media' | 'produce' }

/** The states a seller of animals serves. null: whoever comes to collect it may have it. */
export function statesServed(lot: ServingLot): readonly string[] | null {
  return lot.category === 'fish' || lot.category === 'worms' ? lot.statesServed : null
}
