/** What is sold beside fish. */
export type SupplyKind = 'produce' | 'worms' | 'media'
