import { StyleSheet, View } from 'react-native'

import { kindTitles } from './kind-of'
import { kindWords } from './kind-words'

import { categoryIcons } from '@/components/find/found-facts'
import { categories } from '@/components/find/find-params'
import { ButtonLink } from '@/components/ui/button-link'
import { space } from '@/constants/theme'

/** The four things one can list, one tap each. */
export function KindChoice() {
  return (
    <View role="group" aria-label="List something" style={styles.choices}>
      {categories.map((kind) => (
        <ButtonLink
          key={kind}
          kind="secondary"
          icon={categoryIcons[kind]}
          label={kindWords[kind].label}
          spokenLabel={`${kindWords[kind].label}: ${kindTitles[kind].toLowerCase()}`}
          href={{ pathname: '/sell/listings/new', params: { kind } }}
          style={styles.choice}
        />
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  choices: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  choice: { flexGrow: 1, flexBasis: 140 },
})
