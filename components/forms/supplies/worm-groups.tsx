import { useFormContext, useWatch } from 'react-hook-form'

import { ChipChoice } from './chip-choice'
import { CountPrice } from './count-price'
import { useGoods } from './goods-context'
import { LiveNote } from './live-note'
import { SlotChips } from './slot-chips'
import { SupplyPhotos } from './supply-photos'
import { TermsFields } from './terms-fields'
import { useLotDraft } from './use-lot-draft'
import { WordsField } from './words-field'

import { StatesServed } from '@/components/forms/batch/states-served'
import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { stateFacts } from '@/shared/domain/rules/us-states.facts'

import type { SupplySetting } from './supply-setting'
import type { WormTyping } from './supply-typing'

const yesNo = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
]
const gradings = [
  { value: 'bed-run', label: 'Bed-run, all sizes' },
  { value: 'sized', label: 'Sorted by size' },
]
const methods = [
  { value: 'hand', label: 'By hand' },
  { value: 'sample-weight', label: 'By a weighed sample' },
  { value: 'displacement', label: 'By displacement' },
]
const origins = [
  { value: 'hatched-here', label: 'Bred here' },
  { value: 'grown-on', label: 'Grown on here' },
  { value: 'bought-in', label: 'Bought in' },
]
const remedies = [
  { value: 'refund', label: 'A refund' },
  { value: 'replace', label: 'New worms' },
]
const states = stateFacts.map(({ code, name }) => ({ value: code, label: name }))

export function WormGroups({ setting }: { setting: SupplySetting }) {
  const { wormNotes } = useGoods()
  const notes = wormNotes(useLotDraft(setting), setting.units)
  return (
    <>
      <Kind notes={notes} units={setting.units} />
      <Packs setting={setting} notes={notes} />
      <Legal setting={setting} review={notes.review} />
      <FormGroup groupId="pickup" title="Pickup">
        <SlotChips {...setting} />
        <TermsFields />
      </FormGroup>
      <FormGroup groupId="promise" title="Arrival promise">
        <FieldRow>
          <FieldCell>
            <BoundText<WormTyping>
              name="promise.windowHours"
              label="Alive for"
              suffix="hours"
              hint="4 to 24 hours."
              isFigure
            />
          </FieldCell>
          <FieldCell>
            <BoundText<WormTyping>
              name="promise.survivalDays"
              label="And alive after"
              suffix="days"
              hint="0 for none, or 3 to 7."
              isFigure
            />
          </FieldCell>
        </FieldRow>
        <ChipChoice<WormTyping> name="promise.remedy" label="What do you give?" choices={remedies} />
        <BoundText<WormTyping>
          name="promise.evidence"
          label="What should the buyer show you?"
          maxLength={200}
        />
      </FormGroup>
      <FormGroup groupId="photo" title="Photo and words">
        <SupplyPhotos photos={setting.photos} hint="Of these worms, in their bedding." />
        <WordsField />
      </FormGroup>
    </>
  )
}

type Notes = ReturnType<ReturnType<typeof useGoods>['wormNotes']>

function Kind({ notes, units }: { notes: Notes; units: SupplySetting['units'] }) {
  const { wormKinds } = useGoods()
  const taxonId = useWatch<WormTyping, 'taxonId'>({ name: 'taxonId' })
  const grading = useWatch<WormTyping, 'grading'>({ name: 'grading' })
  const kinds = wormKinds.map((kind) => ({
    value: kind.taxonId as string,
    label: findTaxon(kind.taxonId)?.commonName ?? kind.taxonId,
  }))
  const example = units === 'us' ? ['2 in', '4 in'] : ['50 mm', '100 mm']
  return (
    <FormGroup groupId="what" title="Which worms?">
      <ChipChoice<WormTyping> name="taxonId" label="Kind" choices={kinds} />
      <LiveNote words={findTaxon(taxonId)?.scientificName} />
      <LiveNote words={notes.refused.taxonId} tone="caution" />
      <BoundText<WormTyping> name="strain" label="What you call them" isOptional maxLength={80} />
      <LiveNote words={notes.refused.strain} tone="caution" />
      <ChipChoice<WormTyping> name="grading" label="Sizes" choices={gradings} />
      {grading === 'sized' ? (
        <FieldRow>
          <FieldCell>
            <BoundText<WormTyping> name="sizeLoMm" label="From" placeholder={example[0]} isFigure />
          </FieldCell>
          <FieldCell>
            <BoundText<WormTyping> name="sizeHiMm" label="To" placeholder={example[1]} isFigure />
          </FieldCell>
        </FieldRow>
      ) : null}
      <BoundCheck<WormTyping>
        name="lotChecked"
        label="I have looked through the lot for jumping worms"
        hint="Also called snake worms or Alabama jumpers."
      />
    </FormGroup>
  )
}

function Packs({ setting, notes }: { setting: SupplySetting; notes: Notes }) {
  const kind = useWatch<WormTyping, 'saleUnit.kind'>({ name: 'saleUnit.kind' })
  return (
    <FormGroup groupId="packs" title="Packs and price">
      <ChipChoice<WormTyping>
        name="saleUnit.kind"
        label="How is it sold?"
        choices={[
          { value: 'pack', label: `By the pack of counted ${notes.many}` },
          { value: 'weight', label: 'By packed weight' },
        ]}
      />
      {kind === 'pack' ? (
        <>
          <BoundText<WormTyping>
            name="saleUnit.count"
            label="In one pack"
            placeholder="250"
            suffix={notes.many}
            isFigure
          />
          <ChipChoice<WormTyping> name="countMethod" label="How do you count?" choices={methods} />
        </>
      ) : null}
      {kind === 'weight' ? (
        <BoundText<WormTyping>
          name="saleUnit.netG"
          label="Weight of one pack when packed"
          hint="The worms alone, without bedding and box. They lose water on the way and take it up again."
          placeholder={setting.units === 'us' ? '1 lb' : '500 g'}
        />
      ) : null}
      <CountPrice
        isOnSale={setting.isOnSale}
        priceWords={notes.price}
        placeholders={{ count: '40', price: '$24' }}
      />
      <FieldRow>
        <FieldCell>
          <BoundText<WormTyping> name="overcountPct" label="Extra packed free" suffix="%" isFigure />
        </FieldCell>
        <FieldCell minPx={220}>
          <BoundText<WormTyping>
            name="bedding"
            label="Packed in"
            placeholder="Damp peat and coir"
            maxLength={120}
          />
        </FieldCell>
      </FieldRow>
    </FormGroup>
  )
}

function Legal({ setting, review }: { setting: SupplySetting; review: readonly string[] }) {
  const { setValue } = useFormContext<WormTyping>()
  const origin = useWatch<WormTyping, 'origin'>({ name: 'origin' })
  return (
    <FormGroup groupId="legal" title="Where they come from">
      <ChipChoice<WormTyping>
        name="origin"
        label="Bred, grown on or bought?"
        choices={origins}
        onChosen={(value) => {
          if (value !== 'bought-in') setValue('originState', '')
        }}
      />
      {origin === 'bought-in' ? (
        <BoundChoice<WormTyping>
          name="originState"
          label="From which state?"
          choices={states}
          isFolded
          emptyLabel="Choose"
        />
      ) : null}
      <ChipChoice<WormTyping> name="raisedInUs" label="Raised in the United States?" choices={yesNo} />
      {review.map((sentence) => (
        <LiveNote key={sentence} words={sentence} tone="caution" />
      ))}
      <ChipChoice<WormTyping> name="wildCaught" label="Dug up or caught in the wild?" choices={yesNo} />
      <BoundArea<WormTyping>
        name="licenceNumbers"
        label="Licence or permit numbers"
        hint="Or “none needed”, and why."
        rows={2}
        maxLength={300}
      />
      <StatesServed farm={setting.farm} />
    </FormGroup>
  )
}
