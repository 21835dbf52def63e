// The lazily loaded group of the Sell place: one chunk, imported only through lazy(). The forms themselves are in the
// forms group, which its screens load in turn.
export { BatchScreen } from './batch-screen'
export { BeginBatch } from './begin-batch'
export { FarmScreen } from './farm-screen'
export { KindChoice } from './kind-choice'
export { ManageListing } from './manage-listing'
export { Payouts } from './payouts'
export { Published } from './published'
export { RecordHome } from '@/components/record/record-home'
export { SellHome } from './sell-home'
