import { useRouter } from 'expo-router'
import { FormProvider, useForm, type FieldPath, type UseFormReturn } from 'react-hook-form'

import { clockIn } from './clock-in'
import { useGoods } from './goods-context'
import { nameOfSupplyPointer, supplyLists } from './name-of-supply-pointer'
import { supplyDraftOf, supplyTypingOf } from './supply-draft'
import { SupplyPage } from './supply-page'

import { useAutosave } from '@/components/forms/batch/use-autosave'
import { useBatchPhotos } from '@/components/forms/batch/use-batch-photos'
import { usePublish } from '@/components/forms/batch/use-publish'
import { todayIn } from '@/components/forms/day-text'
import { issueResolver } from '@/components/forms/issue-resolver'
import { useDraft, type OpenedDraft } from '@/hooks/use-draft'

import type { SupplyKind } from './supply-kind'
import type { SupplyTyping } from './supply-typing'
import type { BatchTyping } from '@/components/forms/batch/batch-typing'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  kind: SupplyKind
  own: OwnListing
  opened: OpenedDraft
  shelved: ListingDraft | null
  farm: OwnSeller
  units: UnitSystem
  onLoadNewer: (mine: ListingDraft) => void
  onKeepMine: (mine: ListingDraft) => void
}

export function SupplyForm({ kind, own, opened, shelved, farm, units, onLoadNewer, onKeepMine }: Props) {
  const router = useRouter()
  const goods = useGoods()
  const today = todayIn(farm.zone)
  const readDraft = (typing: SupplyTyping) => supplyDraftOf(typing, { kind, was: opened.draft, units, farm })
  const form = useForm<SupplyTyping>({
    defaultValues: supplyTypingOf(kind, opened.draft, units),
    resolver: issueResolver<SupplyTyping>(
      (typing) =>
        goods.lotIssues(kind, readDraft(typing)).map((issue) => ({ code: 'custom', input: '', ...issue })),
      { lists: supplyLists, whole: ['statesServed'] },
    ),
    mode: 'onTouched',
    shouldFocusError: false,
  })
  const { state, keeper } = useDraft(own, opened)
  useAutosave({ form, keeper, readDraft })
  // Photos stand under the same name in every form; the hook touches nothing else.
  const photos = useBatchPhotos(form as unknown as UseFormReturn<BatchTyping>, today)
  const publishing = usePublish({
    form,
    keeper,
    listingId: own.listingId,
    nameOf: (pointer) => nameOfSupplyPointer(pointer) as FieldPath<SupplyTyping> | null,
    onPublished: () => router.replace(`/sell/listings/${own.listingId}/published`),
  })
  const mine = () => opened.rival ?? readDraft(form.getValues())
  return (
    <FormProvider {...form}>
      <SupplyPage
        kind={kind}
        own={own}
        setting={{
          farm,
          units,
          today,
          now: clockIn(farm.zone),
          photos,
          isOnSale: own.liveVersion !== undefined,
          readDraft,
        }}
        draftState={state}
        publishing={publishing}
        onLoadNewer={() => onLoadNewer(mine())}
        onKeepMine={() => onKeepMine(mine())}
        onUnshelve={
          shelved
            ? () =>
                void keeper.flush().then(
                  () => onKeepMine(shelved),
                  () => undefined,
                )
            : undefined
        }
      />
    </FormProvider>
  )
}
