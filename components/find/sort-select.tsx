import type { Sort } from './find-params'

import { Select } from '@/components/ui/select'
import type { Choice } from '@/components/ui/choice'

const choices: readonly Choice<Sort>[] = [
  { value: 'nearest', label: 'Nearest first' },
  { value: 'cheapest', label: 'Cheapest first' },
  { value: 'soonest', label: 'Soonest pickup first' },
  { value: 'best-rated', label: 'Best rated first' },
]

interface Props {
  sort: Sort
  /** Without a place there is no nearest. */
  hasPlace: boolean
  onChange: (sort: Sort) => void
}

export function SortSelect({ sort, hasPlace, onChange }: Props) {
  return (
    <Select
      label="Order by"
      value={sort}
      choices={hasPlace ? choices : choices.slice(1)}
      onChange={onChange}
    />
  )
}
