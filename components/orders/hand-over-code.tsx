import { StyleSheet } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { fillCaution } from '@/shared/domain/rules/fill-caution'

/** The buyer's six digits, large enough to read at arm's length in the rain. */
export function HandOverCode({ code }: { code: string }) {
  return (
    <Card labelledBy="your-code">
      <Heading level={2} size="lead" nativeID="your-code">
        Your code
      </Heading>
      <Text
        size="hero"
        face="strong"
        isFigures
        style={styles.code}
        aria-label={`Your code is ${code.split('').join(' ')}`}
      >
        {`${code.slice(0, 3)} ${code.slice(3)}`}
      </Text>
      <Text>Count together first. Give the code last: it says that the animals are in your hands.</Text>
      <Text size="note" tint="muted">
        {fillCaution('G-12', {})}
      </Text>
    </Card>
  )
}

const styles = StyleSheet.create({ code: { letterSpacing: 6, paddingVertical: space.sm } })
