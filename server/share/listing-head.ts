import { escapeHtml } from '@/server/mail/escape-html'
import type { ShownListing } from '@/shared/contracts/listings'
import { thingsOf } from '@/shared/domain/listings/count-words'
import { printLotPrice } from '@/shared/domain/listings/lot-price'
import { lotSize } from '@/shared/domain/listings/lot-size'
import { statesServed } from '@/shared/domain/listings/states-served'
import { tierFor } from '@/shared/domain/money/tier-price'
import { printLengthRange } from '@/shared/units/length'

const meta = (property: string, content: string) =>
  `<meta property="${property}" content="${escapeHtml(content)}" />`

/** JSON inside HTML: the one sequence that could end the element is broken up. */
const jsonText = (value: unknown) => JSON.stringify(value).replaceAll('<', '\\u003c')

/** What a shared link shows: title, place, price and picture (Open Graph), and the same as JSON-LD. */
export function listingHead(listing: ShownListing, origin: string): { title: string; tags: string } {
  const { body, seller, photos, listingId, free } = listing
  const unitCents = tierFor(body.tiers, body.minOrder)?.unitCents ?? body.tiers[0]?.unitCents ?? 0
  const size = lotSize(body)
  const title = size
    ? `${listing.title}, ${printLengthRange({ minCm: size.loMm / 10, maxCm: size.hiMm / 10 }, 'us')}`
    : listing.title
  const { price, comparable } = printLotPrice(body, unitCents, 'us')
  const held = thingsOf(body) === 'goods' ? 'you have it in hand' : 'they are alive in hand'
  const about = `${comparable ? `${price} (${comparable})` : price} near ${seller.placeText}. ${free} left. Pickup from ${seller.farmName}; your money is held until ${held}.`
  const url = `${origin}/listings/${listingId}`
  const photo = photos[0]
  const image = photo ? `${origin}/photos/${photo.photoId}-800.webp` : `${origin}/icon-512.png`
  const facts = {
    '@context': 'https://schema.org',
    '@type': 'Product',
    name: title,
    description: about,
    image,
    offers: {
      '@type': 'Offer',
      url,
      price: (unitCents / 100).toFixed(2),
      priceCurrency: 'USD',
      availability: free > 0 ? 'https://schema.org/InStock' : 'https://schema.org/SoldOut',
      ...(statesServed(body) ? { areaServed: statesServed(body) } : {}),
      seller: { '@type': 'Organization', name: seller.farmName },
    },
  }
  const tags = [
    meta('og:type', 'product'),
    meta('og:site_name', 'Tankward'),
    meta('og:title', title),
    meta('og:description', about),
    meta('og:url', url),
    meta('og:image', image),
    meta('og:image:alt', photo?.alt ?? 'Tankward'),
    meta('product:price:amount', (unitCents / 100).toFixed(2)),
    meta('product:price:currency', 'USD'),
    `<link rel="canonical" href="${escapeHtml(url)}" />`,
    `<script type="application/ld+json">${jsonText(facts)}</script>`,
  ].join('\n')
  return { title: `${title} · Tankward`, tags }
}
