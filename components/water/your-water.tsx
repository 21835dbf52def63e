import { useState, useSyncExternalStore } from 'react'
import { StyleSheet, View } from 'react-native'

import { FigureRow } from './figure-row'
import { readFigure, typedFigure } from './water-words'

import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { keepWater, keptWater, onKeptWater } from '@/hooks/kept-water'
import { useUnits } from '@/hooks/use-units'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { compareWaters, type WaterFigure } from '@/shared/domain/water/compare-waters'
import { waterMatch } from '@/shared/domain/water/water-match.facts'

const asked: Record<WaterFigure, { label: string; us: string; metric: string; error: string }> = {
  waterC: {
    label: 'Your temperature',
    us: 'Such as 74 °F',
    metric: 'Such as 23 °C',
    error: 'A temperature, such as 74 F or 23 C.',
  },
  pH: { label: 'Your pH', us: 'Such as 7.2', metric: 'Such as 7.2', error: 'A pH, such as 7.2.' },
  khPpm: {
    label: 'Your carbonate hardness',
    us: 'Such as 120 ppm or 7 dKH',
    metric: 'Such as 120 mg/L or 7 dKH',
    error: 'A hardness, such as 120 ppm or 7 dKH.',
  },
}
const figures = Object.keys(asked) as WaterFigure[]

/** The water the animals come out of against the reader's own tank, and how to bring the two together. */
export function YourWater({ water }: { water: FishBody['water'] }) {
  const kept = useSyncExternalStore(onKeptWater, keptWater, keptWater)
  const theirs = { waterC: water.temperatureC, pH: water.pH, khPpm: water.khPpm }
  const compared = compareWaters(theirs, kept)
  // Fields keep their own words while one types; forgetting begins them anew.
  const [round, setRound] = useState(0)
  function forget() {
    keepWater({})
    setRound(round + 1)
  }
  return (
    <Card labelledBy="your-water">
      <Heading level={2} size="lead" nativeID="your-water">
        Your water and theirs
      </Heading>
      <Text>Type what you last measured in your tank. It stays on this device.</Text>
      <View style={styles.fields}>
        {figures.map((figure) => (
          <View key={`${figure} ${round}`} style={styles.field}>
            <FigureField figure={figure} />
          </View>
        ))}
      </View>
      {compared.length > 0 ? (
        <>
          <View role="list" aria-label="Theirs and yours">
            {compared.map((match) => (
              <FigureRow key={match.figure} match={match} />
            ))}
          </View>
          <Text size="note">{fillCaution('G-8', { hours: String(waterMatch.sealedHours.value) })}</Text>
          <View style={styles.acts}>
            <Button kind="quiet" label="Forget my figures" onPress={forget} />
          </View>
        </>
      ) : null}
    </Card>
  )
}

function FigureField({ figure }: { figure: WaterFigure }) {
  const units = useUnits()
  const [text, setText] = useState(() => typedFigure(figure, keptWater()[figure], units))
  const [isLeft, setIsLeft] = useState(false)
  const isWrong = text.trim() !== '' && readFigure(figure, text, units) === null

  function type(typed: string) {
    setText(typed)
    setIsLeft(false)
    const { [figure]: _before, ...others } = keptWater()
    const read = readFigure(figure, typed, units)
    keepWater(read === null ? others : { ...others, [figure]: read })
  }
  return (
    <NumberField
      label={asked[figure].label}
      hint={asked[figure][units]}
      isOptional={figure === 'khPpm'}
      value={text}
      onChangeText={type}
      onBlur={() => setIsLeft(true)}
      error={isLeft && isWrong ? asked[figure].error : undefined}
    />
  )
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.md, rowGap: space.md },
  field: { flexGrow: 1, flexBasis: 160 },
  acts: { alignItems: 'flex-start' },
})
