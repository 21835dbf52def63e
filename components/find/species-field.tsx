import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { onlySpecies, speciesChoices, speciesName } from './species-choices'
import type { Find } from './use-find'

import { Chip } from '@/components/ui/chip'
import { Combobox } from '@/components/ui/combobox'
import { space } from '@/constants/theme'

const mostChips = 6

/** Any species by name, and the ones most offered here with one tap. */
export function SpeciesField({ find }: { find: Find }) {
  const { state, facets, change } = find
  const [typed, setTyped] = useState<string | null>(null)
  function choose(id: string | undefined) {
    setTyped(null)
    change({ species: id })
  }
  const offered = facets?.species.slice(0, mostChips) ?? []
  return (
    <View style={styles.frame}>
      <Combobox
        label="Species"
        text={typed ?? (state.species ? speciesName(state.species) : '')}
        onChangeText={(text) => (text === '' && state.species ? choose(undefined) : setTyped(text))}
        choices={speciesChoices(typed ?? '')}
        onChoose={({ id }) => choose(id)}
        onSubmit={() => {
          const only = onlySpecies(typed ?? '')
          if (only) choose(only.id)
        }}
        emptyText="No species by that name with us yet."
        placeholder="Any, or a name"
      />
      {offered.length > 0 ? (
        <View role="group" aria-label="Offered here" style={styles.chips}>
          {offered.map(({ speciesId, count }) => (
            <Chip
              key={speciesId}
              label={speciesName(speciesId)}
              count={count}
              isSelected={state.species === speciesId}
              onPress={() => choose(state.species === speciesId ? undefined : speciesId)}
            />
          ))}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
