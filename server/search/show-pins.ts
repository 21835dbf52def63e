import { categoryCode } from '@/server/search/category-codes'
import { theSearch } from '@/server/search/the-search'
import { Problem } from '@/shared/api/problem'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import type { findPins } from '@/shared/contracts/search'

/** Marks inside the bounds of a map: location cells when near, clusters when far away. */
export async function showPins(asked: ParsedQuery<typeof findPins>): Promise<ReplyOf<typeof findPins>> {
  const { south, north, west, east, zoom, category } = asked
  if (south > north) {
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'The south edge lies north of the north edge.', pointer: 'query:south' }],
    })
  }
  const view = { bounds: { south, north, west, east }, zoom }
  const pins = await theSearch().pins(category ? { ...view, categoryCode: categoryCode(category) } : view)
  return { pins }
}
