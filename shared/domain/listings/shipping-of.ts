/** A listing as far as its shipping goes; only batches of fish are shipped. */
export type ShippingLot<Shipping> =
  { category: 'fish'; shipping?: Shipping | undefined } | { category: 'worms' | 'media' | 'produce' }

/** How it is shipped. null: it is collected. */
export function shippingOf<Shipping>(lot: ShippingLot<Shipping>): Shipping | null {
  return lot.category === 'fish' ? (lot.shipping ?? null) : null
}
