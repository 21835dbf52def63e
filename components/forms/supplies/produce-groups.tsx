import { HandlingGroup } from './handling-group'
import { HarvestGroup } from './harvest-group'
import { ProduceWhat } from './produce-what'
import { SlotChips } from './slot-chips'
import { SupplyPhotos } from './supply-photos'
import { TermsFields } from './terms-fields'
import { useGoods } from './goods-context'
import { useLotDraft } from './use-lot-draft'
import { WordsField } from './words-field'

import { FormGroup } from '@/components/forms/form-group'

import type { SupplySetting } from './supply-setting'

/** One crop of one harvest: what changes every week first, what the farm does always behind one tap. */
export function ProduceGroups({ setting }: { setting: SupplySetting }) {
  const { produceNotes } = useGoods()
  const draft = useLotDraft(setting)
  const { farmName, street, city, state, zip } = setting.farm
  const notes = produceNotes(draft, { name: farmName, street, city, state, zip }, setting.units)
  return (
    <>
      <ProduceWhat setting={setting} notes={notes} />
      <HarvestGroup setting={setting} notes={notes} />
      <FormGroup groupId="pickup" title="Pickup">
        <SlotChips {...setting} />
        <TermsFields />
      </FormGroup>
      <HandlingGroup notes={notes} />
      <FormGroup groupId="photo" title="Photo and words">
        <SupplyPhotos photos={setting.photos} hint="Of this harvest. A phone photo by daylight is best." />
        <WordsField caution={notes.words.words} />
      </FormGroup>
    </>
  )
}
