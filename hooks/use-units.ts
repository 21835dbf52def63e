import { useMe } from '@/hooks/use-me'
import type { UnitSystem } from '@/shared/units/unit-system'

/** The member's choice; visitors read US units. */
export function useUnits(): UnitSystem {
  return useMe().me?.units ?? 'us'
}
