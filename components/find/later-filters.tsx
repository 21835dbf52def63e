import { lazy } from 'react'

import type { Find } from './use-find'

import { LazyPart } from '@/components/ui/lazy-part'

const Filters = lazy(() => import('./filters-group').then((group) => ({ default: group.Filters })))

/** The filters load after the listings: nobody waits for the names of species to see what is near. */
export function LaterFilters({ find }: { find: Find }) {
  return (
    <LazyPart label="Loading filters">
      <Filters find={find} />
    </LazyPart>
  )
}
