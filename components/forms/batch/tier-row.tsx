import { useFormContext, useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { checkAgain } from './check-again'

import { BoundText } from '@/components/forms/bound/bound-text'
import { figures } from '@/components/forms/figure'
import { IconButton } from '@/components/ui/icon-button'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { printCents } from '@/shared/units/money'

import type { BatchTyping } from './batch-typing'

interface Props {
  at: number
  onRemove?: () => void
}

export function TierRow({ at, onRemove }: Props) {
  const form = useFormContext<BatchTyping>()
  const checkPrices = () =>
    checkAgain(
      form,
      form
        .getValues('tiers')
        .flatMap((_, row) => [`tiers.${row}.fromCount`, `tiers.${row}.unitCents`] as const),
    )
  const unitText = useWatch<BatchTyping, `tiers.${number}.unitCents`>({ name: `tiers.${at}.unitCents` })
  const unitCents = figures.cents.read(unitText)
  return (
    <View style={styles.row}>
      <View style={styles.fields}>
        <View style={styles.field}>
          <BoundText<BatchTyping>
            name={`tiers.${at}.fromCount`}
            label="From"
            suffix="fish"
            isFigure
            onLeave={checkPrices}
          />
        </View>
        <View style={styles.field}>
          <BoundText<BatchTyping>
            name={`tiers.${at}.unitCents`}
            label="Each"
            placeholder="$0.89"
            isFigure
            onLeave={checkPrices}
          />
        </View>
        {onRemove ? (
          <View style={styles.remove}>
            <IconButton icon="trash" label={`Remove price ${at + 1}`} tint="muted" onPress={onRemove} />
          </View>
        ) : null}
      </View>
      {unitCents ? (
        <Text size="note" tint="muted" isFigures>
          {`${printCents(unitCents)} a fish, ${printCents(unitCents * 100)} per 100`}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  row: {
    gap: space.sm,
    padding: space.md,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
  },
  fields: { flexDirection: 'row', gap: space.md, alignItems: 'flex-start' },
  field: { flex: 1, minWidth: 0 },
  remove: { paddingTop: 27 },
})
