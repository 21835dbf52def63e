import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { UseMyLocation } from './use-my-location'

import { Combobox, type ComboboxChoice } from '@/components/ui/combobox'
import { space, type } from '@/constants/theme'
import type { KeptPlace } from '@/hooks/kept-place'
import { toKeptPlace } from '@/hooks/use-current-place'
import { useFirstPlace, usePlaces } from '@/hooks/use-places'
import type { Place } from '@/shared/contracts/places'

interface Props {
  label: string
  hint?: string
  /** The name of the place in use; '' when there is none. */
  placeLabel: string
  onChoose: (place: KeptPlace) => void
  fieldId?: string
  /** The location sign beside the field instead of a button below it; goes without a hint. */
  isSmall?: boolean
}

/** ZIP, city or the device's own location, always as a cell. */
export function PlaceField({ label, hint, placeLabel, onChoose, fieldId, isSmall }: Props) {
  const [typed, setTyped] = useState<string | null>(null)
  const [fault, setFault] = useState('')
  const { places, isLoading, error } = usePlaces(typed ?? '')
  const findFirst = useFirstPlace()

  function choose(place: Place) {
    setTyped(null)
    setFault('')
    onChoose(toKeptPlace(place))
  }
  async function chooseTyped() {
    if (!typed?.trim()) return
    try {
      const first = await findFirst(typed)
      if (first) choose(first)
      else setFault(noPlace)
    } catch {
      setFault(noAnswer)
    }
  }
  async function chooseCell(cell: string) {
    try {
      const here = await findFirst(cell)
      if (here) choose({ ...here, cell, zip: undefined })
      else setFault('That location is outside the area we know. Type a ZIP code instead.')
    } catch {
      setFault(noAnswer)
    }
  }

  return (
    <View style={isSmall ? styles.row : styles.frame}>
      <View style={styles.field}>
        <Combobox
          label={label}
          hint={hint}
          error={fault || (error ? noAnswer : undefined)}
          fieldId={fieldId}
          text={typed ?? placeLabel}
          onChangeText={(text) => {
            setTyped(text)
            setFault('')
          }}
          choices={places.map(toChoice)}
          onChoose={({ id }) => {
            const chosen = places.find((place) => keyOf(place) === id)
            if (chosen) choose(chosen)
          }}
          isLoading={isLoading}
          emptyText={(typed ?? '').trim().length > 1 ? noPlace : undefined}
          placeholder="ZIP code or town"
          autoComplete="postal-code"
          onSubmit={() => void chooseTyped()}
        />
      </View>
      <View style={isSmall ? styles.beside : null}>
        <UseMyLocation onCell={chooseCell} onFault={setFault} isSmall={isSmall} />
      </View>
    </View>
  )
}

const noPlace = 'No place by that name. Try a five-digit ZIP code, or a town and its state.'
const noAnswer = 'No connection to look up places. Try again in a moment.'
const keyOf = ({ label, cell, zip }: Place) => `${zip ?? ''}-${cell}-${label}`.replace(/[^\w-]/g, '_')
const toChoice = (place: Place): ComboboxChoice => ({
  id: keyOf(place),
  label: place.label,
  detail: place.zip && !place.label.includes(place.zip) ? `ZIP ${place.zip}` : undefined,
})

// Level with the box: the label over it is one line of body text and a gap.
const labelPx = type.body.lineHeight + space.xs

const styles = StyleSheet.create({
  frame: { gap: space.xs, alignSelf: 'stretch' },
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.sm },
  field: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
  beside: { paddingTop: labelPx },
})
