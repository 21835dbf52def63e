import { LaterFilters } from './later-filters'
import type { Find } from './use-find'

import { Button } from '@/components/ui/button'
import { Sheet } from '@/components/ui/sheet'

interface Props {
  find: Find
  isOpen: boolean
  onClose: () => void
}

export function FilterSheet({ find, isOpen, onClose }: Props) {
  const { search, found } = find
  const label = search.isFetching
    ? 'Show listings'
    : `Show ${found.length}${search.hasNextPage ? '+' : ''} ${found.length === 1 ? 'listing' : 'listings'}`
  return (
    <Sheet
      title="Filters"
      isOpen={isOpen}
      onClose={onClose}
      footer={<Button isWide label={label} onPress={onClose} />}
    >
      <LaterFilters find={find} />
    </Sheet>
  )
}
