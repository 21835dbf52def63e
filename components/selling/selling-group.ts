// The lazily loaded group of the Sell place, without its forms: one chunk, imported only through lazy().
export { BeginBatch } from './begin-batch'
export { ManageListing } from './manage-listing'
export { Payouts } from './payouts'
export { Published } from './published'
export { SellHome } from './sell-home'
