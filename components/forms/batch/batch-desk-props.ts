import type { BatchSetting } from './batch-group'
import type { usePublish } from './use-publish'
import type { DraftState } from '@/hooks/draft-keeper'
import type { OwnListing } from '@/shared/contracts/listings'

/** What both faces of the form are given: one step at a time on a phone, the whole on a wider screen. */
export interface BatchDeskProps {
  own: OwnListing
  setting: BatchSetting
  draftState: DraftState
  publishing: ReturnType<typeof usePublish>
  onLoadNewer: () => void
  onKeepMine: () => void
  /** Brings back the version that was set aside; absent when there is none. */
  onUnshelve?: () => void
}
