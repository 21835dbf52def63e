import { useWatch } from 'react-hook-form'

import { ChipChoice } from './chip-choice'
import { CountPrice } from './count-price'
import { useGoods } from './goods-context'
import { LiveNote } from './live-note'
import { SlotChips } from './slot-chips'
import { SupplyPhotos } from './supply-photos'
import { TermsFields } from './terms-fields'
import { useLotDraft } from './use-lot-draft'
import { WordsField } from './words-field'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'

import type { SupplySetting } from './supply-setting'
import type { MediaTyping } from './supply-typing'

const yesNo = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
]
const vinegar = [
  { value: 'no-fizz', label: 'No fizz' },
  { value: 'fizzes', label: 'It fizzes' },
  { value: 'not-done', label: 'Not done' },
]
const heat = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
  { value: 'unknown', label: 'Unknown' },
]
const uses = [
  { value: 'new', label: 'New' },
  { value: 'used', label: 'Used before' },
]

type Notes = ReturnType<ReturnType<typeof useGoods>['mediaNotes']>

export function MediaGroups({ setting }: { setting: SupplySetting }) {
  const { mediaNotes } = useGoods()
  const notes = mediaNotes(useLotDraft(setting), setting.units)
  return (
    <>
      <Material notes={notes} units={setting.units} />
      <Bags setting={setting} notes={notes} />
      <FormGroup groupId="pickup" title="Pickup">
        <SlotChips {...setting} />
        <TermsFields />
      </FormGroup>
      <FormGroup groupId="photo" title="Photo and words">
        <SupplyPhotos
          photos={setting.photos}
          hint="Of the material itself: a handful beside a coin says most."
        />
        <WordsField />
      </FormGroup>
    </>
  )
}

function Material({ notes, units }: { notes: Notes; units: SupplySetting['units'] }) {
  const { mediaMaterials } = useGoods()
  const material = useWatch<MediaTyping, 'material'>({ name: 'material' })
  const used = useWatch<MediaTyping, 'used'>({ name: 'used' })
  const example = units === 'us' ? ['1/4 in', '5/8 in'] : ['8 mm', '16 mm']
  return (
    <FormGroup groupId="what" title="What is it?">
      <BoundChoice<MediaTyping>
        name="material"
        label="Material"
        choices={mediaMaterials.map(({ id, name }) => ({ value: id, label: name }))}
        isFolded
        emptyLabel="Choose"
      />
      {material === 'other' ? (
        <BoundText<MediaTyping> name="materialWords" label="Name the material" maxLength={80} />
      ) : null}
      {notes.hasGrain ? (
        <>
          <FieldRow>
            <FieldCell>
              <BoundText<MediaTyping>
                name="grainLoMm"
                label="Finest grain"
                placeholder={example[0]}
                isFigure
              />
            </FieldCell>
            <FieldCell>
              <BoundText<MediaTyping>
                name="grainHiMm"
                label="Coarsest grain"
                placeholder={example[1]}
                isFigure
              />
            </FieldCell>
          </FieldRow>
          <ChipChoice<MediaTyping> name="rinsed" label="Rinsed?" choices={yesNo} />
          <ChipChoice<MediaTyping>
            name="vinegarTest"
            label="A handful in vinegar"
            hint="Stone that fizzes holds lime and pushes the pH up."
            choices={vinegar}
          />
        </>
      ) : null}
      {notes.mayCarryWorms ? (
        <>
          <ChipChoice<MediaTyping>
            name="heatTreated"
            label="Heat treated?"
            hint="So that no worm, egg or seed lives in it."
            choices={heat}
          />
          <LiveNote words={notes.heat} tone="caution" />
        </>
      ) : null}
      <ChipChoice<MediaTyping> name="used" label="New or used?" choices={uses} />
      {used === 'used' ? (
        <BoundArea<MediaTyping>
          name="usedWords"
          label="Used in what?"
          hint="What lived in it, and any salt, copper or medicine."
          rows={2}
          maxLength={400}
        />
      ) : null}
    </FormGroup>
  )
}

function Bags({ setting, notes }: { setting: SupplySetting; notes: Notes }) {
  const kind = useWatch<MediaTyping, 'saleUnit.kind'>({ name: 'saleUnit.kind' })
  const isUs = setting.units === 'us'
  return (
    <FormGroup groupId="bags" title="Bags and price">
      <ChipChoice<MediaTyping>
        name="saleUnit.kind"
        label="How is it sold?"
        choices={[
          { value: 'volume', label: 'By volume' },
          { value: 'weight', label: 'By net weight' },
        ]}
      />
      {kind === 'volume' ? (
        <FieldRow>
          <FieldCell>
            <BoundText<MediaTyping>
              name="saleUnit.litres"
              label="In one bag"
              placeholder={isUs ? '1.8 cu ft' : '50 L'}
            />
          </FieldCell>
          <FieldCell>
            <BoundText<MediaTyping>
              name="saleUnit.weightKg"
              label="One bag weighs"
              placeholder={isUs ? '31 lb' : '14 kg'}
            />
          </FieldCell>
        </FieldRow>
      ) : null}
      {kind === 'weight' ? (
        <BoundText<MediaTyping>
          name="saleUnit.netG"
          label="Net weight of one bag"
          placeholder={isUs ? '25 lb' : '10 kg'}
        />
      ) : null}
      <LiveNote words={notes.weight} tone="caution" />
      <LiveNote words={notes.load} />
      <CountPrice
        isOnSale={setting.isOnSale}
        priceWords={notes.price}
        placeholders={{ count: '20', price: '$40' }}
      />
    </FormGroup>
  )
}
