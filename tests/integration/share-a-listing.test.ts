import { describe, expect, it } from 'vitest'

import { batchBody } from '@/seed/batch-body'
import { listingHead } from '@/server/share/listing-head'
import type { ShownListing } from '@/shared/contracts/listings'

const listing: ShownListing = {
  listingId: 'A'.repeat(22),
  state: 'live',
  title: 'Bluegill fingerlings </script><script>alert(1)</script>',
  body: batchBody(new Date('2027-01-10T12:00:00Z'), {}),
  version: 1,
  free: 240,
  seller: {
    sellerId: 'B'.repeat(22),
    farmName: 'Marsh "Hatchery" & Sons',
    kind: 'hatchery',
    placeText: 'Dayton, OH',
    state: 'OH',
    since: '2026-03-02T12:00:00.000Z',
  },
  lat: 39.7,
  lng: -84.2,
  windows: [],
  photos: [
    { photoId: '0'.repeat(32), widthPx: 800, heightPx: 600, ground: '#112233', alt: 'Fish beside a ruler' },
  ],
  alsoOnSale: 0,
  may: [],
}

describe('what a shared link shows', () => {
  const head = listingHead(listing, 'https://tankward.example')

  it('names price, place and picture', () => {
    expect(head.tags).toContain('content="$1.00 each near Dayton, OH. 240 left.')
    expect(head.tags).toContain(`content="https://tankward.example/photos/${'0'.repeat(32)}-800.webp"`)
    expect(head.tags).toContain('content="1.00"')
  })

  it('lets no word of a seller end an element or an attribute', () => {
    expect(head.tags.match(/<script/g)).toHaveLength(1)
    expect(head.tags.match(/<\/script>/g)).toHaveLength(1)
    expect(head.tags).not.toContain('alert(1)</script>')
    const json = /<script type="application\/ld\+json">(.*)<\/script>/.exec(head.tags)?.[1] ?? ''
    expect(JSON.parse(json)).toMatchObject({
      '@type': 'Product',
      offers: { price: '1.00', priceCurrency: 'USD' },
    })
  })
})
