import { useFormContext, useWatch } from 'react-hook-form'

import { ChipChoice } from './chip-choice'
import { CountPrice } from './count-price'
import { CropPicker } from './crop-picker'
import { useGoods } from './goods-context'
import { LiveNote } from './live-note'

import { BoundText } from '@/components/forms/bound/bound-text'
import { FormGroup } from '@/components/forms/form-group'
import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'

import type { SupplySetting } from './supply-setting'
import type { ProduceTyping } from './supply-typing'
import type * as Goods from './supplies-group'
import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'

const forms = [
  { value: 'whole', label: 'Whole' },
  { value: 'harvest-cut', label: 'Leaves cut at harvest' },
  { value: 'cut-mixed-or-washed', label: 'Cut, mixed or washed to eat' },
]
const methodLabels: Partial<Record<SaleUnitKind, string>> = {
  each: 'By the piece',
  head: 'By the head',
  bunch: 'By the bunch',
  weight: 'By net weight',
  'dry-pint': 'By the dry pint',
}

interface Props {
  setting: SupplySetting
  notes: ReturnType<typeof Goods.produceNotes>
}

export function ProduceWhat({ setting, notes }: Props) {
  const form = useFormContext<ProduceTyping>()
  const { findCrop } = useGoods()
  const kind = useWatch<ProduceTyping, 'saleUnit.kind'>({ name: 'saleUnit.kind' })
  const { methods, bunchNeedsWeight, price } = notes
  const isWeighed = kind === 'weight' || kind === 'bunch'
  const priceWords = price ? [price.price, price.comparable].filter(Boolean).join(', ') : null
  /** The usual way to sell the crop; a way the last crop was sold that this one is not sold by is taken back. */
  function followCrop(cropId: string) {
    const crop = findCrop(cropId)
    if (!crop) return
    const kept = crop.soldBy.some((one) => one === form.getValues('saleUnit.kind'))
    if (!kept) form.setValue('saleUnit.kind', crop.soldBy[0] ?? '', { shouldDirty: true })
    if (!form.getValues('form')) form.setValue('form', 'whole', { shouldDirty: true })
  }
  return (
    <FormGroup groupId="what" title="What is it?">
      <CropPicker onChosen={followCrop} />
      {methods.length > 0 ? (
        <>
          <ChipChoice<ProduceTyping> name="form" label="In which form?" choices={forms} />
          <LiveNote words={notes.held} tone="caution" />
          <LiveNote words={notes.held ? null : `Buyers read: “${notes.label ?? cautionTexts['G-9']}”`} />
          <ChipChoice<ProduceTyping>
            name="saleUnit.kind"
            label="How is it sold?"
            choices={methods.map((method) => ({ value: method, label: methodLabels[method] ?? method }))}
          />
          {isWeighed ? (
            <BoundText<ProduceTyping>
              name="saleUnit.netG"
              label={kind === 'bunch' ? 'Least net weight of one bunch' : 'Net weight of one'}
              hint="Without box or root ball, with its unit."
              placeholder={setting.units === 'us' ? '8 oz' : '250 g'}
              isOptional={kind === 'bunch' && !bunchNeedsWeight}
            />
          ) : null}
        </>
      ) : null}
      <CountPrice
        isOnSale={setting.isOnSale}
        priceWords={priceWords}
        placeholders={{ count: '14', price: '$3' }}
      />
    </FormGroup>
  )
}
