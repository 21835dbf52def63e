import { PlaceField } from '@/components/places/place-field'
import { useToast } from '@/components/ui/toast'
import type { KeptPlace } from '@/hooks/kept-place'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useChangeMe } from '@/hooks/use-me'
import type { Me } from '@/shared/contracts/members'

export function PlaceSetting({ place }: { place: Me['place'] }) {
  const change = useChangeMe()
  const { choose } = useCurrentPlace()
  const toast = useToast()
  function keep(chosen: KeptPlace) {
    choose(chosen)
    change.mutate(
      { place: chosen.near, placeLabel: chosen.label },
      {
        onSuccess: () => toast({ text: `Your place is now ${chosen.label}.`, tone: 'safe' }),
        onError: ({ message }) => toast({ text: message, tone: 'danger' }),
      },
    )
  }
  return (
    <PlaceField
      label="Your place"
      hint="Where your animals live. We keep an area of about 3 by 3 miles, never an address, and show distances from its middle."
      placeLabel={place?.label ?? ''}
      onChoose={keep}
    />
  )
}
