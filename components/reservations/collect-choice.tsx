import type { Reservation } from './use-reservation'

import { PlaceField } from '@/components/places/place-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { printSlot } from '@/shared/times/print-time'

/** Where they will live and when they are collected. */
export function CollectChoice({ form }: { form: Reservation }) {
  return (
    <>
      <PlaceField
        label="Where will they live?"
        hint="Rules differ by state. Only the area is kept."
        placeLabel={form.place?.label ?? ''}
        onChoose={form.choose}
        fieldId="place"
      />
      {form.open.length > 0 ? (
        <RadioGroup
          label="Pickup time"
          fieldId="window"
          value={form.windowId}
          onChange={form.setWindow}
          choices={form.open.map((window) => ({
            value: window.windowId,
            label: printSlot(window),
            hint: `${window.placesLeft} ${window.placesLeft === 1 ? 'place' : 'places'} left`,
          }))}
          error={form.errorAt('window')}
        />
      ) : null}
    </>
  )
}
