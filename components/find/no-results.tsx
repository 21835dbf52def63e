import { StyleSheet, View } from 'react-native'

import { appliedWords } from './applied-words'
import { categoryIcons } from './found-facts'
import { categoryNames } from './category-words'
import { usualWithinKm, type FindState } from './find-params'
import { reachOf, widerReach } from './reach'

import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'

interface Props {
  state: FindState
  /** '' before a place is known. */
  placeLabel: string
  thisMonday: string | undefined
  onChange: (part: Partial<FindState>) => void
}

/** An empty list says what would fill it: a wider circle, or one wish less. */
export function NoResults({ state, placeLabel, thisMonday, onChange }: Props) {
  const units = useUnits()
  const withinKm = state.withinKm ?? usualWithinKm
  const wider = placeLabel ? widerReach(withinKm, units) : undefined
  const applied = appliedWords(state, units, thisMonday)
  const where = placeLabel ? `within ${reachOf(withinKm, units).label} of ${placeLabel}` : 'anywhere'
  const what = state.category && state.category !== 'fish' ? categoryNames[state.category].toLowerCase() : ''
  return (
    <EmptyState
      icon={categoryIcons[state.category ?? 'fish']}
      title={what ? `Nobody lists ${what} ${where} yet` : `Nothing fits ${where}`}
      body={
        wider || applied.length > 0
          ? 'Change one thing and look again:'
          : 'New batches come every week. Look again soon, or try another place.'
      }
      action={
        <View style={styles.acts}>
          {wider ? (
            <Button
              kind="secondary"
              label={`Try ${wider.label}`}
              onPress={() => onChange({ withinKm: wider.km })}
            />
          ) : null}
          {applied.map(({ anyWords, off }) => (
            <Button key={anyWords} kind="secondary" label={`Try ${anyWords}`} onPress={() => onChange(off)} />
          ))}
        </View>
      }
    />
  )
}

const styles = StyleSheet.create({
  acts: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'center', gap: space.sm },
})
