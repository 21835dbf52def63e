import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { openDataSources, printSource, sources, type SourceKey } from '@/shared/sources'

const ours: readonly SourceKey[] = ['memory', 'house-rule', 'demonstration', 'trade-practice']
const isPublished = (key: SourceKey) => !ours.includes(key) && !openDataSources.includes(key)
const published = (Object.keys(sources) as SourceKey[]).filter(isPublished)

const parts: readonly { title: string; intro: string; keys: readonly SourceKey[] }[] = [
  {
    title: 'Places, climate, forecast and holidays',
    intro:
      'Towns and their people come from GeoNames (Creative Commons Attribution 4.0; we snapped them to areas). ZIP areas and climate normals are works of the US government. Forecasts of the coming week come from the weather service that this installation names; a practice installation invents them and says so.',
    keys: openDataSources,
  },
  {
    title: 'Animals, water, transport and law',
    intro:
      'In brackets: how far we have read it. What was only read in part or in somebody else’s copy says so.',
    keys: published,
  },
  {
    title: 'What nobody published',
    intro: 'Figures of these kinds are marked wherever they decide something.',
    keys: ours,
  },
]

/** Every publication and data set that a figure of ours rests on. */
export function AboutSources() {
  return (
    <>
      {parts.map(({ title, intro, keys }) => (
        <Card key={title}>
          <Heading level={2} size="lead">
            {title}
          </Heading>
          <Text>{intro}</Text>
          <View role="list">
            {keys.map((key) => (
              <View key={key} role="listitem" style={styles.row}>
                <Text size="note">{printSource(key)}</Text>
              </View>
            ))}
          </View>
        </Card>
      ))}
      <Card>
        <Heading level={2} size="lead">
          Software
        </Heading>
        <Text>
          Tankward stands on open-source libraries under the MIT, ISC, BSD and Apache licences; their names
          and versions are in the project’s lock file. The typefaces are Bricolage Grotesque and Atkinson
          Hyperlegible Next, under the SIL Open Font License.
        </Text>
      </Card>
      <Link href="/tools">The calculators that use them</Link>
    </>
  )
}

const styles = StyleSheet.create({
  row: { paddingVertical: space.sm, borderTopWidth: 1, borderTopColor: color.line },
})
