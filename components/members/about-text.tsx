import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { ButtonLink } from '@/components/ui/button-link'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'

export function AboutText() {
  return (
    <View style={styles.frame}>
      <Part title="What it is">
        <Text>
          Small hatcheries raise thousands of young fish and have no time for forty messages. Home growers
          need twenty, healthy, the right size, on a known day. Tankward brings the two together: what is near
          comes first, with its size in inches, its price for your number, its pickup days and what we know
          about the rules where you live.
        </Text>
        <Text>
          We sell no animals ourselves. Growers list what they raise; a moderator looks at listings before
          they can be found.
        </Text>
      </Part>
      <Part title="How your money is held">
        <Text>
          You pay a deposit by card when you hold animals, and the rest before you collect. Our payment
          processor holds both until you confirm that the animals are alive and in hand. Then the grower is
          paid, less our fee.
        </Text>
        <Text>
          If the grower cancels, is not there, or does not answer, everything goes back to your card. If you
          cancel late or do not come, the grower may keep the deposit, never more.
        </Text>
      </Part>
      <Part title="What happens to places">
        <Text>
          “Use my location” stays on your device: it is rounded to an area of about 3 by 3 miles before
          anything is sent. Growers are shown as such an area too, and all distances run from the middle of
          one to the middle of the other. Street and phone show only to the two parties of an order, once it
          is scheduled.
        </Text>
      </Part>
      <Part title="What we are not">
        <Text>
          {cautionTexts['G-13']} Rules about live animals differ by state and change; we show what we found,
          where and when, and say so where nobody has looked. Please check with your state agency before you
          pay.
        </Text>
        <Text>{cautionTexts['G-1']}</Text>
      </Part>
      <Part title="Where our figures come from">
        <Text>
          Every limit that can decide whether animals live names its publication.{' '}
          <Link href="/about/sources">All sources</Link> · <Link href="/tools">Calculators</Link>
        </Text>
      </Part>
      <ButtonLink icon="find" href="/" label="Find growers near you" />
    </View>
  )
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <View style={styles.part}>
      <Heading level={2}>{title}</Heading>
      {children}
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.xl }, part: { gap: space.sm } })
