import { Router } from 'express'

import { appShell } from '@/server/http/app-shell'
import { readListing } from '@/server/listings/read-listing'
import { escapeHtml } from '@/server/mail/escape-html'
import { listingHead } from '@/server/share/listing-head'
import { listPublicListings } from '@/server/share/sitemap-store'
import { publicIdText } from '@/shared/contracts/values'

interface ShareSettings {
  webDir: string
  origin: string
}

/** The app's shell with another title and more in its head. */
function dressed(shell: string, head: { title: string; tags: string }): string {
  return shell
    .replace(/<title>[^<]*<\/title>/, () => `<title>${escapeHtml(head.title)}</title>`)
    .replace('</head>', () => `${head.tags}\n</head>`)
}

/** What stands in the HTML itself, for those who read no script: link previews and search engines. */
export function shareRoutes({ webDir, origin }: ShareSettings): Router {
  const router = Router()
  router.get('/listings/:listingId', async (req, res, next) => {
    const { listingId } = req.params
    if (!publicIdText.safeParse(listingId).success) return next()
    const listing = await readListing(null, listingId, undefined).catch(() => null)
    if (!listing) return next()
    res.setHeader('cache-control', 'no-cache')
    res.vary('Cookie')
    res.type('html').send(dressed(appShell(webDir, req, listing.title), listingHead(listing, origin)))
  })
  router.get('/sitemap.xml', async (_req, res) => {
    const pages = ['/', '/about', '/about/sources', '/tools'].map(
      (page) => `<url><loc>${escapeHtml(origin + page)}</loc></url>`,
    )
    const listings = (await listPublicListings()).map(
      ({ publicId, updatedAt }) =>
        `<url><loc>${escapeHtml(`${origin}/listings/${publicId}`)}</loc><lastmod>${updatedAt.toISOString().slice(0, 10)}</lastmod></url>`,
    )
    res.setHeader('cache-control', 'public, max-age=3600')
    res
      .type('application/xml')
      .send(
        `<?xml version="1.0" encoding="UTF-8"?>\n<urlset xmlns="http://www.sitemaps.org/schemas/sitemap/0.9">\n${[...pages, ...listings].join('\n')}\n</urlset>\n`,
      )
  })
  return router
}
