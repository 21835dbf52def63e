// The lazily loaded group of what one reads after Find: a listing and its seller.
export { HoldBar } from './hold-bar'
export { ListingFault } from './listing-fault'
export { ListingStory } from './listing-story'
export { SellerFault } from '@/components/sellers/seller-fault'
export { SellerStory } from '@/components/sellers/seller-story'
