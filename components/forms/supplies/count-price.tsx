import { useWatch } from 'react-hook-form'
import { View, StyleSheet } from 'react-native'

import { LiveNote } from './live-note'

import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow } from '@/components/forms/form-group'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { unitNoun } from '@/shared/domain/listings/unit-words'

import type { SupplyTyping } from './supply-typing'
import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'

interface Props {
  isOnSale: boolean
  /** What it comes to, in a measure people can compare. */
  priceWords: string | null
  placeholders: { count: string; price: string }
}

const kinds: readonly string[] = ['each', 'head', 'bunch', 'weight', 'dry-pint', 'pack', 'volume']

/** How many there are, and what one costs. */
export function CountPrice({ isOnSale, priceWords, placeholders }: Props) {
  const kind = useWatch<SupplyTyping, 'saleUnit.kind'>({ name: 'saleUnit.kind' })
  const known = kinds.includes(kind) ? { kind: kind as SaleUnitKind } : null
  return (
    <View style={styles.frame}>
      <FieldRow>
        {isOnSale ? null : (
          <FieldCell>
            <BoundText<SupplyTyping>
              name="countOnHand"
              label="How many"
              placeholder={placeholders.count}
              suffix={known ? unitNoun(known, 2) : undefined}
              isFigure
            />
          </FieldCell>
        )}
        <FieldCell>
          <BoundText<SupplyTyping>
            name="tiers.0.unitCents"
            label={known ? `Price of one ${unitNoun(known, 1)}` : 'Price of one'}
            placeholder={placeholders.price}
            isFigure
          />
        </FieldCell>
      </FieldRow>
      {isOnSale ? (
        <Text size="note" tint="muted">
          It is on sale, so its count is kept in stock: correct it on the page of the listing.
        </Text>
      ) : null}
      <LiveNote words={priceWords} />
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.sm } })
