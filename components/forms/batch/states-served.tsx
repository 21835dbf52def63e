import { useWatch } from 'react-hook-form'

import { BoundChips } from '@/components/forms/bound/bound-chips'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { findState } from '@/shared/domain/rules/find-state'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** The states whose buyers may order: those the farm has answered the licence question for. */
export function StatesServed({ farm }: { farm: OwnSeller }) {
  const served = useWatch<BatchTyping, 'statesServed'>({ name: 'statesServed' })
  const answered = farm.licences.map((licence) => licence.state)
  const offered = [...new Set([...answered, ...served])].sort()
  return (
    <BoundChips<BatchTyping>
      name="statesServed"
      label="Buyers from these states"
      choices={offered.map((code) => ({ value: code, label: findState(code)?.name ?? code }))}
    >
      <Text size="note" tint="muted">
        {'To sell into another state, '}
        <Link href="/sell/farm" size="note">
          answer its licence question
        </Link>
        {' first. This draft is kept.'}
      </Text>
    </BoundChips>
  )
}
