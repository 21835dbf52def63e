import { useSyncExternalStore } from 'react'

import { keepPlace, keptPlace, onKeptPlace, type KeptPlace } from './kept-place'

import { useMe } from '@/hooks/use-me'
import type { Me } from '@/shared/contracts/members'
import type { Place } from '@/shared/contracts/places'

interface CurrentPlace {
  /** null: nobody has said where they are. */
  place: KeptPlace | null
  /** False while the member's own place is still being asked for. */
  isKnown: boolean
  choose: (place: KeptPlace) => void
}

/** The place in use: what was last chosen on this device, else the member's own. Only ever a cell or a ZIP. */
export function useCurrentPlace(): CurrentPlace {
  const chosen = useSyncExternalStore(onKeptPlace, keptPlace, () => null)
  const { me, error } = useMe()
  const own = placeOfMember(me)
  const isKnown = chosen !== null || me !== undefined || error !== null
  return { place: chosen ?? own, isKnown, choose: keepPlace }
}

function placeOfMember(me: Me | null | undefined): KeptPlace | null {
  return me?.place ? { near: me.place.cell, ...me.place } : null
}

/** Of a found place, what may be kept. */
export function toKeptPlace({ zip, cell, label, state }: Place): KeptPlace {
  return { near: zip ?? cell, cell, label, state }
}
