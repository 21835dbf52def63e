import { useRouter } from 'expo-router'
import { FormProvider, useForm } from 'react-hook-form'

import { batchAsks } from './batch-asks'
import { batchBlank, batchDefaults } from './batch-defaults'
import { batchIssues } from './batch-issues'
import { draftFromTyping } from './draft-from-typing'
import { batchLists, nameOfPointer } from './name-of-pointer'
import { SteppedBatch } from './stepped-batch'
import { typingFromDraft } from './typing-from-draft'
import { useAutosave } from './use-autosave'
import { useBatchPhotos } from './use-batch-photos'
import { usePublish } from './use-publish'
import { WholeBatch } from './whole-batch'

import { issueResolver } from '@/components/forms/issue-resolver'
import { licenceWords } from './licence-words'
import { todayIn } from '@/components/forms/day-text'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useDraft, type OpenedDraft } from '@/hooks/use-draft'

import type { BatchTyping } from './batch-typing'
import type { OwnListing, ListingDraft } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface BatchFormProps {
  own: OwnListing
  opened: OpenedDraft
  farm: OwnSeller
  units: UnitSystem
  /** The version the seller set aside when two had to be chosen from. */
  shelved: ListingDraft | null
  /** The step a phone opens with: the one a moderator asked about. */
  firstStep: number
  /** What the seller can do about a draft that was changed elsewhere. */
  onLoadNewer: (mine: ListingDraft) => void
  onKeepMine: (mine: ListingDraft) => void
}

export function BatchForm(props: BatchFormProps) {
  const { own, opened, farm, units, shelved, onLoadNewer, onKeepMine } = props
  const router = useRouter()
  const breakpoint = useBreakpoint()
  const today = todayIn(farm.zone)
  const readDraft = (typing: BatchTyping) => draftFromTyping(typing, { was: opened.draft, units })
  const form = useForm<BatchTyping>({
    defaultValues: openTyping(props),
    resolver: issueResolver<BatchTyping>((typing) => batchIssues(readDraft(typing)), {
      lists: batchLists,
      whole: ['statesServed', 'shipping.days'],
      asks: batchAsks,
    }),
    mode: 'onTouched',
    shouldFocusError: false,
  })
  const { state, keeper } = useDraft(own, opened)
  useAutosave({ form, keeper, readDraft })
  const photos = useBatchPhotos(form, today)
  const publishing = usePublish({
    form,
    keeper,
    listingId: own.listingId,
    nameOf: nameOfPointer,
    onPublished: () => router.replace(`/sell/listings/${own.listingId}/published`),
  })
  const mine = () => opened.rival ?? readDraft(form.getValues())
  const desk = {
    own,
    setting: { farm, units, today, photos, isOnSale: own.liveVersion !== undefined },
    draftState: state,
    publishing,
    onLoadNewer: () => onLoadNewer(mine()),
    onKeepMine: () => onKeepMine(mine()),
    onUnshelve: shelved
      ? () =>
          void keeper.flush().then(
            () => onKeepMine(shelved),
            () => undefined,
          )
      : undefined,
  }
  return (
    <FormProvider {...form}>
      {breakpoint === 'phone' ? (
        <SteppedBatch {...desk} firstStep={props.firstStep} />
      ) : (
        <WholeBatch {...desk} />
      )}
    </FormProvider>
  )
}

function openTyping({ own, opened, farm, units }: Pick<BatchFormProps, 'own' | 'opened' | 'farm' | 'units'>) {
  const isNew = own.draftRevision === 0 && !opened.unsent
  const usual = batchDefaults({ ownState: farm.state, licenceNumbers: licenceWords(farm.licences) })
  return typingFromDraft(opened.draft, { base: isNew ? usual : batchBlank(), units })
}
