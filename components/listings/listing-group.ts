// The lazily loaded group of what one reads after Find: a listing and its seller.
export { ListingScreen } from './listing-screen'
export { SellerFault } from '@/components/sellers/seller-fault'
export { SellerStory } from '@/components/sellers/seller-story'
